import type { ReactNode } from 'react'

type DisclosureProps = {
  readonly summary: ReactNode
  readonly children: ReactNode
  readonly open?: boolean | undefined
}

/** Something that can be opened, by the browser's own element: works before any script has loaded. */
export const Disclosure = ({ summary, children, open }: DisclosureProps) => (
  <details open={open} className="group min-w-0">
    <summary className="flex min-h-8 items-baseline gap-2 rounded py-1 hover:bg-sunk">
      <svg
        viewBox="0 0 10 10"
        aria-hidden="true"
        className="size-2.5 shrink-0 text-copper transition-transform group-open:rotate-90"
      >
        <path d="M2 0L9 5L2 10Z" fill="currentColor" />
      </svg>
      <span className="min-w-0 flex-1">{summary}</span>
    </summary>
    <div className="ml-1 border-l-2 border-copper py-1 pl-4">{children}</div>
  </details>
)
