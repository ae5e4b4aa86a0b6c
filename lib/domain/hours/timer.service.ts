import 'server-only'

import { deleteTimer, findTimer, insertTimeEntry, insertTimer } from '@/db/repositories/time-entry.repo'
import { withTx } from '@/db/tx'
import { err, ok } from '@/lib/core/result'

import { engagementFor } from '../engagements/engagement-resource'
import { noInput } from '../form-fields'
import { operation } from '../operation'
import { noTimer, timerRunning } from './hours.errors'
import { startTimerSchema } from './hours.schema'

const longestEntrySeconds = 24 * 60 * 60

/** The person's running timer, or null. */
export const myTimer = operation('hours.myTimer', noInput, async (deps, actor) => {
  const timer = await findTimer(deps.db, actor.personId)
  if (!timer) return ok(null)
  return ok({
    engagementId: timer.engagement_id,
    engagementTitle: timer.engagement_title,
    text: timer.text,
    startedAt: timer.started_at,
    now: deps.clock.now(),
  })
})

/** Starts the one timer that a person can have. */
export const startTimer = operation('hours.startTimer', startTimerSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const engagement = await engagementFor(tx, actor, 'time.track', input.engagementId)
    if (!engagement.ok) return engagement
    const running = await findTimer(tx, actor.personId)
    if (running) return err(timerRunning(running.engagement_title))
    await insertTimer(tx, {
      person_id: actor.personId,
      engagement_id: input.engagementId,
      work_kind: input.workKind,
      text: input.text,
      started_at: deps.clock.now(),
    })
    return ok({ engagementId: input.engagementId })
  }),
)

/** Stops the timer; what it measured becomes a draft of the person's own. */
export const stopTimer = operation('hours.stopTimer', noInput, async (deps, actor) =>
  withTx(deps.db, async (tx) => {
    const timer = await findTimer(tx, actor.personId)
    if (!timer) return err(noTimer)
    const now = deps.clock.now()
    // Rounded down, so that the next timer never begins within this one.
    const seconds = Math.max(1, Math.floor((now - timer.started_at) / 1000))
    const timeEntryId = deps.ids.newId()
    await insertTimeEntry(tx, {
      id: timeEntryId,
      engagement_id: timer.engagement_id,
      person_id: actor.personId,
      work_kind: timer.work_kind,
      text: timer.text,
      started_at: timer.started_at,
      worked_seconds: Math.min(seconds, longestEntrySeconds),
      posted_minutes: null,
      posted_at: null,
      created_at: now,
    })
    await deleteTimer(tx, actor.personId)
    return ok({ timeEntryId, engagementId: timer.engagement_id })
  }),
)
