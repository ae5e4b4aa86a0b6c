import type { ReactNode } from 'react'

import { classNames } from './class-names'

type SheetProps = {
  readonly title?: ReactNode
  /** Heading level of the title; 2 unless the sheet sits inside a section. */
  readonly level?: 2 | 3 | undefined
  readonly actions?: ReactNode
  readonly children: ReactNode
  /** No inner margin: for a table that fills the sheet. */
  readonly flush?: boolean | undefined
  readonly id?: string | undefined
}

/** A sheet of paper on the bench: one subject, a heading on a ruled line, its actions at the right. */
export const Sheet = ({ title, level = 2, actions, children, flush = false, id }: SheetProps) => {
  const Heading = level === 2 ? 'h2' : 'h3'
  return (
    <section id={id} className="min-w-0 rounded border border-rule bg-sheet">
      {title || actions ? (
        <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-b border-rule px-4 py-2.5 sm:px-5">
          {title ? <Heading className={level === 2 ? 'text-lg' : 'text-base'}>{title}</Heading> : null}
          {actions ? <div className="flex flex-wrap items-center gap-2">{actions}</div> : null}
        </div>
      ) : null}
      <div className={classNames(!flush && 'px-4 py-4 sm:px-5')}>{children}</div>
    </section>
  )
}
