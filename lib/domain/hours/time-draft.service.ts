import 'server-only'

import type { Tx } from '@/db/client'
import {
  deleteTimeEntry,
  findTimeEntry,
  insertTimeEntry,
  updateTimeEntry,
  type TimeEntryRow,
} from '@/db/repositories/time-entry.repo'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { notFound, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import { engagementFor, type LoadedEngagement } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { alreadyPosted, notInThePast } from './hours.errors'
import { addTimeSchema, editTimeSchema, timeEntryIdSchema } from './hours.schema'

/** Enters time that was worked without the timer, as a draft. */
export const addTime = operation('hours.addTime', addTimeSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const engagement = await engagementFor(tx, actor, 'time.track', input.engagementId)
    if (!engagement.ok) return engagement
    const now = deps.clock.now()
    if (input.startedAt + input.workedMinutes * 60_000 > now) return err(notInThePast)
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
      created_at: now,
    })
    return ok({ timeEntryId })
  }),
)

/** Changes what a draft says was done. */
export const editTime = operation('hours.editTime', editTimeSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const own = await ownEntry(tx, actor, input.timeEntryId)
    if (!own.ok) return own
    if (own.value.row.posted_at !== null) return err(alreadyPosted)
    await updateTimeEntry(tx, input.timeEntryId, { work_kind: input.workKind, text: input.text })
    return ok({ timeEntryId: input.timeEntryId })
  }),
)

/** Throws a draft away. */
export const discardTime = operation('hours.discardTime', timeEntryIdSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const own = await ownEntry(tx, actor, input.timeEntryId)
    if (!own.ok) return own
    if (own.value.row.posted_at !== null) return err(alreadyPosted)
    await deleteTimeEntry(tx, input.timeEntryId)
    return ok({ timeEntryId: input.timeEntryId })
  }),
)

export type OwnEntry = { readonly row: TimeEntryRow; readonly engagement: LoadedEngagement }

/** A time entry of the person's own; anybody else's answers as an unknown one. */
export async function ownEntry(tx: Tx, actor: Actor, timeEntryId: string): Promise<Result<OwnEntry, Denial>> {
  const row = await findTimeEntry(tx, timeEntryId)
  if (!row || row.person_id !== actor.personId) return err(notFound)
  const engagement = await engagementFor(tx, actor, 'time.track', row.engagement_id)
  return engagement.ok ? ok({ row, engagement: engagement.value }) : engagement
}
