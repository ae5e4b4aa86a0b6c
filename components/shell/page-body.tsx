import type { ReactNode } from 'react'

type PageBodyProps = {
  readonly children: ReactNode
  /** A narrower column beside the main one on wide screens, below it on the phone. */
  readonly aside?: ReactNode
}

/** The content under a page header, with the margins of every page. */
export const PageBody = ({ children, aside }: PageBodyProps) => (
  <div className="mx-auto max-w-page px-4 pt-6 sm:px-6">
    {aside ? (
      <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,1fr)_20rem]">
        <div className="flex min-w-0 flex-col gap-6">{children}</div>
        <div className="flex min-w-0 flex-col gap-6">{aside}</div>
      </div>
    ) : (
      <div className="flex min-w-0 flex-col gap-6">{children}</div>
    )}
  </div>
)
