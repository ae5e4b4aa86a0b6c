import 'server-only'

import type { Db } from '@/db/client'

export async function countThrottleEvents(db: Db, bucket: string, since: number): Promise<number> {
  const row = await db
    .selectFrom('throttle_event')
    .select((select) => select.fn.countAll<number>().as('count'))
    .where('bucket', '=', bucket)
    .where('at', '>', since)
    .executeTakeFirstOrThrow()
  return row.count
}

export async function addThrottleEvent(db: Db, bucket: string, at: number): Promise<void> {
  await db.insertInto('throttle_event').values({ bucket, at }).execute()
}

export async function dropThrottleEvents(db: Db, bucket: string): Promise<void> {
  await db.deleteFrom('throttle_event').where('bucket', '=', bucket).execute()
}

export async function dropThrottleEventsBefore(db: Db, instant: number): Promise<void> {
  await db.deleteFrom('throttle_event').where('at', '<', instant).execute()
}
