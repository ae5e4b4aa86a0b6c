import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { creditBlock, type NewBlock } from '@/lib/domain/hours/credit-block'
import { addTime } from '@/lib/domain/hours/time-draft.service'

import type { TestEngagement } from './engagement'
import { testStart, type TestPortal } from './test-portal'
import { valueOf } from './value-of'

export const dayLength = 24 * 60 * 60_000

/** Credits a block to a company as a purchase would, valid from now on for a year unless told otherwise. */
export async function creditTestBlock(
  portal: TestPortal,
  companyId: string,
  block: Partial<Pick<NewBlock, 'minutes' | 'title' | 'validFrom' | 'validUntil'>> = {},
): Promise<string> {
  const sourceId = portal.deps.ids.newId()
  const now = portal.clock.now()
  await withTx(portal.db, (tx) =>
    creditBlock(tx, portal.deps, {
      companyId,
      title: 'Ten hours',
      minutes: 600,
      validFrom: now,
      validUntil: now + 365 * dayLength,
      source: { kind: 'purchase', id: sourceId },
      ...block,
    }),
  )
  return sourceId
}

const isoMinute = (instant: number): string => new Date(instant).toISOString().slice(0, 16)

/**
 * A draft of the given length by the consultant of the engagement. Drafts of one test lie apart, on days of their own
 * before the start of the test, because one person cannot work twice at once.
 */
export async function draftTime(
  portal: TestPortal,
  engagement: TestEngagement,
  workedMinutes: number,
  { daysAgo = 1, actor = engagement.consultant }: { daysAgo?: number; actor?: Actor } = {},
): Promise<string> {
  const added = await addTime.execute(portal.deps, actor, {
    engagementId: engagement.engagementId,
    workKind: 'analysis',
    text: 'Fitted the ring',
    startedAt: isoMinute(testStart - daysAgo * dayLength),
    workedMinutes: String(workedMinutes),
  })
  return valueOf(added).timeEntryId
}

export type StoredMovement = { readonly block_id: string; readonly kind: string; readonly minutes: number }

/** The ledger of a company straight from its table, in the order of writing. */
export const storedLedger = (portal: TestPortal, companyId: string): Promise<StoredMovement[]> =>
  portal.db
    .selectFrom('hour_ledger_entry')
    .select(['block_id', 'kind', 'minutes'])
    .where('company_id', '=', companyId)
    .orderBy('created_at')
    .execute()

export const foldOf = (ledger: readonly StoredMovement[]): number =>
  ledger.reduce((sum, entry) => sum + entry.minutes, 0)
