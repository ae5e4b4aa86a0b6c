import 'server-only'
import type { Insertable, Selectable, Updateable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { RunningTimerTable, TimeEntryTable } from '@/db/tables/hours'

export type TimeEntryRow = Selectable<TimeEntryTable>
export type TimerRow = Selectable<RunningTimerTable> & { readonly engagement_title: string }

export function findTimer(db: Db | Tx, personId: string): Promise<TimerRow | undefined> {
  return db
    .selectFrom('running_timer')
    .innerJoin('engagement', 'engagement.id', 'running_timer.engagement_id')
    .where('person_id', '=', personId)
    .selectAll('running_timer')
    .select('engagement.title as engagement_title')
    .executeTakeFirst()
}

export async function insertTimer(tx: Tx, timer: Insertable<RunningTimerTable>): Promise<void> {
  await tx.insertInto('running_timer').values(timer).execute()
}

export async function deleteTimer(tx: Tx, personId: string): Promise<void> {
  await tx.deleteFrom('running_timer').where('person_id', '=', personId).execute()
}

export async function insertTimeEntry(tx: Tx, entry: Insertable<TimeEntryTable>): Promise<void> {
  await tx.insertInto('time_entry').values(entry).execute()
}

export function findTimeEntry(db: Db | Tx, timeEntryId: string): Promise<TimeEntryRow | undefined> {
  return db.selectFrom('time_entry').selectAll().where('id', '=', timeEntryId).executeTakeFirst()
}

export type TimeSpan = { readonly personId: string; readonly from: number; readonly to: number }

/** Another entry of the person that shares time with the span [from, to), in UTC milliseconds; the earliest one. */
export function findOverlap(
  tx: Tx,
  span: TimeSpan,
  among: { readonly exceptId?: string; readonly postedOnly?: boolean } = {},
): Promise<(TimeEntryRow & { engagement_title: string }) | undefined> {
  return tx
    .selectFrom('time_entry')
    .innerJoin('engagement', 'engagement.id', 'time_entry.engagement_id')
    .where('person_id', '=', span.personId)
    .where('started_at', '<', span.to)
    .where((where) =>
      where(
        where('worked_seconds', '*', 1000),
        '>',
        where(where.val(span.from), '-', where.ref('started_at')),
      ),
    )
    .$if(among.exceptId !== undefined, (query) => query.where('time_entry.id', '<>', among.exceptId ?? ''))
    .$if(among.postedOnly === true, (query) => query.where('posted_at', 'is not', null))
    .orderBy('started_at')
    .selectAll('time_entry')
    .select('engagement.title as engagement_title')
    .executeTakeFirst()
}

export async function updateTimeEntry(
  tx: Tx,
  timeEntryId: string,
  change: Updateable<TimeEntryTable>,
): Promise<void> {
  await tx.updateTable('time_entry').set(change).where('id', '=', timeEntryId).execute()
}

export async function deleteTimeEntry(tx: Tx, timeEntryId: string): Promise<void> {
  await tx.deleteFrom('time_entry').where('id', '=', timeEntryId).execute()
}

/** One person's own time on an engagement that has not been posted yet, newest first. */
export function listDrafts(db: Db, engagementId: string, personId: string): Promise<TimeEntryRow[]> {
  return db
    .selectFrom('time_entry')
    .selectAll()
    .where('engagement_id', '=', engagementId)
    .where('person_id', '=', personId)
    .where('posted_at', 'is', null)
    .orderBy('started_at', 'desc')
    .execute()
}

/** Posted time of everybody on an engagement, newest first. */
export function listPosted(
  db: Db,
  engagementId: string,
): Promise<(TimeEntryRow & { person_name: string })[]> {
  return db
    .selectFrom('time_entry')
    .innerJoin('person', 'person.id', 'time_entry.person_id')
    .where('engagement_id', '=', engagementId)
    .where('posted_at', 'is not', null)
    .orderBy('started_at', 'desc')
    .selectAll('time_entry')
    .select('person.name as person_name')
    .execute()
}
