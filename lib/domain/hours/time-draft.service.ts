import 'server-only'

import type { Tx } from '@/db/client'
import {
  deleteTimeEntry,
  findOverlap,
  findTimeEntry,
  insertTimeEntry,
  updateTimeEntry,
  type TimeEntryRow,
} from '@/db/repositories/time-entry.repo'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { notFound, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { engagementFor, type LoadedEngagement } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { alreadyPosted, notInThePast, overlaps, type HoursError } from './hours.errors'
import { addTimeSchema, editTimeSchema, timeEntryIdSchema } from './hours.schema'

/** Enters time that was worked without the timer, as a draft. */
export const addTime = operation('hours.addTime', addTimeSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const engagement = await engagementFor(tx, actor, 'time.track', input.engagementId)
    if (!engagement.ok) return engagement
    const free = await freeSpan(tx, deps, actor, input)
    if (!free.ok) return free
    const timeEntryId = deps.ids.newId()
    await insertTimeEntry(tx, {
      id: timeEntryId,
      engagement_id: input.engagementId,
      person_id: actor.personId,
      work_kind: input.workKind,
      text: input.text,
      started_at: input.startedAt,
      worked_seconds: input.workedMinutes * 60,
      posted_minutes: null,
      posted_at: null,
      created_at: deps.clock.now(),
    })
    return ok({ timeEntryId })
  }),
)

/** Changes what a draft says: when, how long and what was done. */
export const editTime = operation('hours.editTime', editTimeSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const own = await ownDraft(tx, actor, input.timeEntryId)
    if (!own.ok) return own
    const free = await freeSpan(tx, deps, actor, input, input.timeEntryId)
    if (!free.ok) return free
    await updateTimeEntry(tx, input.timeEntryId, {
      work_kind: input.workKind,
      text: input.text,
      started_at: input.startedAt,
      worked_seconds: input.workedMinutes * 60,
    })
    return ok({ timeEntryId: input.timeEntryId })
  }),
)

/** Throws a draft away. */
export const discardTime = operation('hours.discardTime', timeEntryIdSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const own = await ownDraft(tx, actor, input.timeEntryId)
    if (!own.ok) return own
    await deleteTimeEntry(tx, input.timeEntryId)
    return ok({ timeEntryId: input.timeEntryId })
  }),
)

export type OwnEntry = { readonly row: TimeEntryRow; readonly engagement: LoadedEngagement }

/** A draft of the person's own. Anybody else's answers as an unknown one; posted time is never touched again. */
export async function ownDraft(
  tx: Tx,
  actor: Actor,
  timeEntryId: string,
): Promise<Result<OwnEntry, Denial | HoursError>> {
  const row = await findTimeEntry(tx, timeEntryId)
  if (!row || row.person_id !== actor.personId) return err(notFound)
  const engagement = await engagementFor(tx, actor, 'time.track', row.engagement_id)
  if (!engagement.ok) return engagement
  return row.posted_at === null ? ok({ row, engagement: engagement.value }) : err(alreadyPosted)
}

const minute = 60_000

type Span = { readonly startedAt: number; readonly workedMinutes: number }

/** Whether a span lies in the past and shares no time with another entry of the person. */
async function freeSpan(
  tx: Tx,
  deps: Deps,
  actor: Actor,
  span: Span,
  exceptId?: string,
): Promise<Result<true, HoursError>> {
  const to = span.startedAt + span.workedMinutes * minute
  // What is typed has whole minutes: the minute that is running counts as worked.
  if (to > Math.ceil(deps.clock.now() / minute) * minute) return err(notInThePast)
  const among = exceptId === undefined ? {} : { exceptId }
  const other = await findOverlap(tx, { personId: actor.personId, from: span.startedAt, to }, among)
  return other ? err(overlapWith(other)) : ok(true)
}

export const overlapWith = (other: TimeEntryRow & { readonly engagement_title: string }): HoursError =>
  overlaps(other.engagement_title, other.started_at, other.started_at + other.worked_seconds * 1000)
