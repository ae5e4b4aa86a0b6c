import type { ReactNode } from 'react'

type EmptyStateProps = {
  /** What is not here yet. */
  readonly title: ReactNode
  /** The next step, in a sentence. */
  readonly children: ReactNode
  readonly action?: ReactNode
}

/** An empty page of the notebook: it says what belongs here and how to begin. */
export const EmptyState = ({ title, children, action }: EmptyStateProps) => (
  <div className="bench-grid rounded border border-rule bg-sheet p-4 sm:p-8">
    <div className="inline-block max-w-measure bg-sheet p-4 outline outline-1 outline-rule">
      <p className="font-serif text-lg font-semibold">{title}</p>
      <div className="mt-1 text-ink-soft">{children}</div>
      {action ? <div className="mt-4 flex flex-wrap gap-3">{action}</div> : null}
    </div>
  </div>
)
