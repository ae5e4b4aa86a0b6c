import type { ReactNode } from 'react'

import { classNames } from './class-names'

export type NoticeTone = 'info' | 'success' | 'caution' | 'error'

type NoticeProps = {
  readonly tone?: NoticeTone | undefined
  readonly title?: ReactNode
  readonly children?: ReactNode
  /** Announce it when it appears after an action; an error interrupts, the others wait. */
  readonly live?: boolean | undefined
}

const looks: Record<NoticeTone, { word: string; box: string; mark: string; path: string }> = {
  info: {
    word: 'Note',
    box: 'border-ink-soft bg-sunk',
    mark: 'text-ink-soft',
    path: 'M10 1.5A8.5 8.5 0 1 1 9.99 1.5ZM10 9V14.5M10 5.5V7.2',
  },
  success: {
    word: 'Done',
    box: 'border-ink bg-sheet',
    mark: 'text-ink',
    path: 'M2.5 10.5L7.5 15.5L17.5 4.5',
  },
  caution: {
    word: 'Caution',
    box: 'border-copper bg-copper-wash',
    mark: 'text-copper',
    path: 'M10 1L19 10L10 19L1 10ZM10 5.5V11M10 12.8V14.6',
  },
  error: {
    word: 'Error',
    box: 'border-over-limit bg-over-limit-wash',
    mark: 'text-over-limit',
    path: 'M2 2H18V18H2ZM6 6L14 14M14 6L6 14',
  },
}

/** A sentence about the state of the page or the outcome of an action. */
export const Notice = ({ tone = 'info', title, children, live = false }: NoticeProps) => {
  const look = looks[tone]
  const role = live ? (tone === 'error' ? 'alert' : 'status') : undefined
  return (
    <div role={role} className={classNames('flex gap-3 rounded border border-l-4 px-4 py-3', look.box)}>
      <svg viewBox="0 0 20 20" aria-hidden="true" className={classNames('mt-0.5 size-5 shrink-0', look.mark)}>
        <path d={look.path} fill="none" stroke="currentColor" strokeWidth="1.75" />
      </svg>
      <div className="min-w-0 max-w-measure">
        <span className="sr-only">{look.word}: </span>
        {title ? <p className="font-semibold">{title}</p> : null}
        {children ? <div>{children}</div> : null}
      </div>
    </div>
  )
}
