import type { ReportStatus } from '@/db/tables/reports'

/**
 * The life of a report. Each step is open from the listed states only; skips and repeats are refused.
 *
 *     draft ─submit→ in_review ─approve→ approved ─author signs→ author_signed ─reviewer signs→ released
 *       ↑               │ return
 *       └── returned ←──┘   (edited and submitted again)
 */
export const reportSteps = {
  edit: ['draft', 'returned'],
  submit: ['draft', 'returned'],
  remark: ['in_review'],
  return: ['in_review'],
  approve: ['in_review'],
  signAsAuthor: ['approved'],
  signAsReviewer: ['author_signed'],
  read: ['released', 'withdrawn'],
} as const satisfies Record<string, readonly ReportStatus[]>

export type ReportStep = keyof typeof reportSteps

export const isOpen = (step: ReportStep, status: ReportStatus): boolean =>
  (reportSteps[step] as readonly ReportStatus[]).includes(status)
