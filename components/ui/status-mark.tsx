import type { ReactNode } from 'react'

import { classNames } from './class-names'

/** Each state has its own shape; the colour repeats it and never carries it alone. */
export type StatusKind = 'verified' | 'over-limit' | 'attention' | 'active' | 'waiting' | 'draft' | 'closed'

const outline = { fill: 'none', stroke: 'currentColor', strokeWidth: 1.75 } as const

const shapes: Record<StatusKind, { tone: string; shape: ReactNode }> = {
  verified: {
    tone: 'text-verified',
    shape: <path d="M1.5 6.5L4.8 10L10.5 2.5" {...outline} strokeWidth={2.25} />,
  },
  'over-limit': {
    tone: 'text-over-limit',
    shape: <path d="M0.5 9.5H11.5V11.5H0.5ZM1.5 7.5L6 0.5L10.5 7.5Z" fill="currentColor" />,
  },
  attention: { tone: 'text-copper', shape: <path d="M6 1L11 6L6 11L1 6Z" fill="currentColor" /> },
  active: { tone: 'text-ink', shape: <circle cx="6" cy="6" r="4.5" fill="currentColor" /> },
  waiting: {
    tone: 'text-ink',
    shape: (
      <>
        <circle cx="6" cy="6" r="4.2" {...outline} />
        <path d="M6 1.8A4.2 4.2 0 0 1 6 10.2Z" fill="currentColor" />
      </>
    ),
  },
  draft: {
    tone: 'text-ink-soft',
    shape: <circle cx="6" cy="6" r="4.2" {...outline} strokeDasharray="2 1.77" />,
  },
  closed: {
    tone: 'text-ink-soft',
    shape: <path d="M2 2H10V10H2ZM2 10L10 2" {...outline} strokeWidth={1.5} />,
  },
}

type StatusMarkProps = { readonly kind: StatusKind; readonly children: ReactNode }

export const StatusMark = ({ kind, children }: StatusMarkProps) => {
  const { tone, shape } = shapes[kind]
  return (
    <span
      className={classNames('inline-flex items-center gap-1.5 whitespace-nowrap text-sm font-semibold', tone)}
    >
      <svg viewBox="0 0 12 12" aria-hidden="true" className="size-3 shrink-0">
        {shape}
      </svg>
      {children}
    </span>
  )
}
