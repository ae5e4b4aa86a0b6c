import type { Source } from '@/lib/core/method/method'

/** Where the formulas are published, or that they are ours, and how they were checked. */
export const SourceList = ({ sources }: { readonly sources: readonly Source[] }) => (
  <ul className="flex max-w-measure flex-col gap-1.5 text-sm">
    {sources.map(({ citation, standing }) => (
      <li key={citation}>
        {citation} <span className="text-ink-faint">({standing})</span>
      </li>
    ))}
  </ul>
)
