import type { ReactNode } from 'react'

import { Breadcrumbs, type Crumb } from '../ui/breadcrumbs'

type PageHeaderProps = {
  readonly title: ReactNode
  readonly crumbs?: readonly Crumb[] | undefined
  /** One or two sentences on what this page is for. */
  readonly lead?: ReactNode
  /** State and dates of the subject, beside the title. */
  readonly meta?: ReactNode
  readonly actions?: ReactNode
  /** TabLinks that divide the subject. */
  readonly tabs?: ReactNode
}

/** The head of a page on a band of the 5 mm rule: where we are, what it is, what can be done. */
export const PageHeader = ({ title, crumbs, lead, meta, actions, tabs }: PageHeaderProps) => (
  <div className="bench-grid border-b border-rule-strong">
    <div className="mx-auto max-w-page px-4 pt-5 sm:px-6">
      {crumbs ? (
        <div className="mb-1.5">
          <Breadcrumbs crumbs={crumbs} />
        </div>
      ) : null}
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-3 pb-5">
        <div className="min-w-0 max-w-3xl">
          <h1 className="text-2xl [overflow-wrap:anywhere] sm:text-3xl">{title}</h1>
          {lead ? <p className="mt-1.5 max-w-measure text-ink-soft">{lead}</p> : null}
          {meta ? (
            <div className="mt-2.5 flex flex-wrap items-center gap-x-5 gap-y-1 text-sm">{meta}</div>
          ) : null}
        </div>
        {actions ? <div className="no-print flex flex-wrap gap-3">{actions}</div> : null}
      </div>
      {tabs ? <div className="-mt-1 [&>nav]:border-b-0">{tabs}</div> : null}
    </div>
  </div>
)
