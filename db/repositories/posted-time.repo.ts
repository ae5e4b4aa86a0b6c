import 'server-only'

import type { Db, Tx } from '@/db/client'

/** All minutes that were posted to an engagement, by whomever. */
export async function postedMinutesOf(db: Db | Tx, engagementId: string): Promise<number> {
  const row = await db
    .selectFrom('time_entry')
    .select((select) => select.fn.sum<number>('posted_minutes').as('minutes'))
    .where('engagement_id', '=', engagementId)
    .executeTakeFirst()
  return row?.minutes ?? 0
}

/** All minutes that were posted to the engagements of a company. */
export async function postedMinutesOfCompany(db: Db, companyId: string): Promise<number> {
  const row = await db
    .selectFrom('time_entry')
    .innerJoin('engagement', 'engagement.id', 'time_entry.engagement_id')
    .where('engagement.company_id', '=', companyId)
    .select((select) => select.fn.sum<number>('time_entry.posted_minutes').as('minutes'))
    .executeTakeFirst()
  return row?.minutes ?? 0
}
