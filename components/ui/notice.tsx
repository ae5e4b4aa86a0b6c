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
  info: { word: 'Note', box: 'border-ink-soft bg-sunk', mark: 'text-ink-soft', path: 'M8 7V12M8 4V5.4' },
  success: { word: 'Done', box: 'border-ink bg-sheet', mark: 'text-ink', path: 'M3 8.5L6.5 12L13 4.5' },
  caution: {
    word: 'Caution',
    box: 'border-copper bg-copper-wash',
    mark: 'text-copper',
    path: 'M8 3V9M8 11.2V12.8',
  },
  error: {
    word: 'Error',
    box: 'border-over-limit bg-over-limit-wash',
    mark: 'text-over-limit',
    path: 'M4 4L12 12M12 4L4 12',
  },
}

/** A sentence about the state of the page or the outcome of an action. */
export const Notice = ({ tone = 'info', title, children, live = false }: NoticeProps) => {
  const look = looks[tone]
  const role = live ? (tone === 'error' ? 'alert' : 'status') : undefined
  return (
    <div role={role} className={classNames('flex gap-3 rounded border border-l-4 px-4 py-3', look.box)}>
      <svg viewBox="0 0 16 16" aria-hidden="true" className={classNames('mt-1 size-4 shrink-0', look.mark)}>
        <path d={look.path} fill="none" stroke="currentColor" strokeWidth="2" />
      </svg>
      <div className="min-w-0 max-w-measure">
        <span className="sr-only">{look.word}: </span>
        {title ? <p className="font-semibold">{title}</p> : null}
        {children ? <div>{children}</div> : null}
      </div>
    </div>
  )
}
