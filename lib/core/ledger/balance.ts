import type { LedgerEntry, LedgerKind } from './ledger-entry'
import { ledgerKinds } from './ledger-entry'
import { minutes, type Minutes } from './minutes'

type Movement = Pick<LedgerEntry, 'minutes'>

/** The balance of a ledger: the sum of its entries, in minutes. Their order does not matter. */
export const balanceOf = (entries: readonly Movement[]): Minutes =>
  minutes(entries.reduce((sum: number, entry) => sum + entry.minutes, 0))

/** The balance as it was at an instant (UTC milliseconds), that instant included. */
export const balanceAt = (
  entries: readonly Pick<LedgerEntry, 'minutes' | 'at'>[],
  instant: number,
): Minutes => balanceOf(entries.filter((entry) => entry.at <= instant))

/** What is left of each block that has an entry, by its id. */
export function remainingByBlock(
  entries: readonly Pick<LedgerEntry, 'minutes' | 'blockId'>[],
): ReadonlyMap<string, Minutes> {
  const remaining = new Map<string, Minutes>()
  for (const { blockId, minutes: moved } of entries) {
    remaining.set(blockId, minutes((remaining.get(blockId) ?? 0) + moved))
  }
  return remaining
}

/** The sum of each kind of entry: what a statement shows above its balance. */
export function totalsByKind(
  entries: readonly Pick<LedgerEntry, 'minutes' | 'kind'>[],
): Readonly<Record<LedgerKind, Minutes>> {
  const totalOf = (kind: LedgerKind) => balanceOf(entries.filter((entry) => entry.kind === kind))
  return Object.fromEntries(ledgerKinds.map((kind) => [kind, totalOf(kind)])) as Record<LedgerKind, Minutes>
}
