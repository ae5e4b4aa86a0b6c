import 'server-only'

import type { Tx } from '@/db/client'
import { insertLedgerEntry } from '@/db/repositories/hour-ledger.repo'
import { postedMinutesOf } from '@/db/repositories/posted-time.repo'
import { findOverlap, listDrafts, listPosted, updateTimeEntry } from '@/db/repositories/time-entry.repo'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { isAllowed } from '@/lib/authz/authorize'
import { allocateDebit } from '@/lib/core/ledger/allocate-debit'
import { billableMinutes } from '@/lib/core/ledger/billable-minutes'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { approvedCapOf, engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { capExceeded, insufficientHours, noScope, type HoursError } from './hours.errors'
import { engagementIdSchema, timeEntryIdSchema } from './hours.schema'
import { openBlocks, spendableMinutes } from './open-blocks'
import { overlapWith, ownDraft, type OwnEntry } from './time-draft.service'

/** The time on an engagement: posted time for everybody on it, one's own drafts, and what room is left. */
export const engagementTime = operation(
  'hours.engagementTime',
  engagementIdSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'time.readPosted', input.engagementId)
    if (!engagement.ok) return engagement
    const { row, resource } = engagement.value
    const mayTrack = isAllowed(actor, 'time.track', resource)
    const posted = await listPosted(deps.db, input.engagementId)
    const drafts = mayTrack ? await listDrafts(deps.db, input.engagementId, actor.personId) : []
    const blocks = await openBlocks(deps.db, row.company_id)
    return ok({
      mayTrack,
      capMinutes: await approvedCapOf(deps.db, input.engagementId),
      postedMinutes: posted.reduce((sum, entry) => sum + (entry.posted_minutes ?? 0), 0),
      spendableMinutes: spendableMinutes(blocks, deps.clock.now()),
      posted: posted.map((entry) => ({
        timeEntryId: entry.id,
        by: entry.person_name,
        workKind: entry.work_kind,
        text: entry.text,
        startedAt: entry.started_at,
        minutes: entry.posted_minutes ?? 0,
      })),
      drafts: drafts.map((entry) => ({
        timeEntryId: entry.id,
        workKind: entry.work_kind,
        text: entry.text,
        startedAt: entry.started_at,
        workedSeconds: entry.worked_seconds,
        /** What posting it now would debit. */
        minutes: billableMinutes(entry.worked_seconds),
      })),
    })
  },
)

/**
 * Posts a draft: rounds it up to the practice's six minutes, checks the approved cap, and debits the client's oldest
 * valid blocks, all in one transaction or not at all. Errors: `already_posted`, `overlaps`, `no_scope`, `cap_exceeded`,
 * `insufficient_hours`.
 */
export const postTime = operation('hours.postTime', timeEntryIdSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const own = await ownDraft(tx, actor, input.timeEntryId)
    if (!own.ok) return own
    return post(tx, deps, actor, own.value)
  }),
)

async function post(
  tx: Tx,
  deps: Deps,
  actor: Actor,
  { row, engagement }: OwnEntry,
): Promise<Result<{ readonly minutes: number }, HoursError>> {
  const minutes = billableMinutes(row.worked_seconds)
  const other = await findOverlap(tx, spanOf(row), { postedOnly: true })
  if (other) return err(overlapWith(other))
  const cap = await approvedCapOf(tx, row.engagement_id)
  if (cap === null) return err(noScope)
  const left = cap - (await postedMinutesOf(tx, row.engagement_id))
  if (minutes > left) return err(capExceeded(minutes, Math.max(0, left)))
  const now = deps.clock.now()
  const debit = allocateDebit(await openBlocks(tx, engagement.row.company_id), minutes, now)
  if (!debit.ok) return err(insufficientHours(debit.error.needed, debit.error.available))
  for (const allocation of debit.value) {
    await insertLedgerEntry(tx, {
      id: deps.ids.newId(),
      company_id: engagement.row.company_id,
      block_id: allocation.blockId,
      kind: 'debit',
      minutes: -allocation.minutes,
      source_kind: 'time_entry',
      source_id: row.id,
      engagement_id: row.engagement_id,
      text: row.text,
      created_by: actor.personId,
      created_at: now,
    })
  }
  await updateTimeEntry(tx, row.id, { posted_minutes: minutes, posted_at: now })
  return ok({ minutes })
}

const spanOf = (row: OwnEntry['row']) => ({
  personId: row.person_id,
  from: row.started_at,
  to: row.started_at + row.worked_seconds * 1000,
})
