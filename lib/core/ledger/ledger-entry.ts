import type { Minutes } from './minutes'

export const ledgerKinds = ['credit', 'debit', 'reversal', 'expiry', 'adjustment'] as const

export type LedgerKind = (typeof ledgerKinds)[number]

/**
 * One movement of hours. Entries are never changed or removed: a correction is another entry. Credits are positive,
 * debits and expiries negative; reversals and adjustments have either sign.
 */
export type LedgerEntry = {
  readonly kind: LedgerKind
  readonly minutes: Minutes
  readonly blockId: string
  /** UTC milliseconds. */
  readonly at: number
}
