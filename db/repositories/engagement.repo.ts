import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { EngagementStatus, EngagementTable } from '@/db/tables/engagements'

export type EngagementRow = Selectable<EngagementTable> & { readonly company_name: string }

const withCompany = (db: Db | Tx) =>
  db
    .selectFrom('engagement')
    .innerJoin('company', 'company.id', 'engagement.company_id')
    .selectAll('engagement')
    .select('company.name as company_name')

export function findEngagement(db: Db | Tx, engagementId: string): Promise<EngagementRow | undefined> {
  return withCompany(db).where('engagement.id', '=', engagementId).executeTakeFirst()
}

/** Which engagements somebody may know of: all, those of whole companies, and those that they are on. */
export type EngagementReach = {
  readonly all: boolean
  readonly companyIds: readonly string[]
  readonly onCompanyIds: readonly string[]
  readonly clientPersonId: string
  readonly consultantPersonId: string | null
}

export function listEngagementsWithin(db: Db, reach: EngagementReach): Promise<EngagementRow[]> {
  const query = withCompany(db).orderBy('engagement.number', 'desc')
  if (reach.all) return query.execute()
  return query
    .where((where) => {
      const on = where.exists(
        where
          .selectFrom('engagement_client')
          .select('person_id')
          .whereRef('engagement_client.engagement_id', '=', 'engagement.id')
          .where('engagement_client.person_id', '=', reach.clientPersonId)
          .where('engagement_client.removed_at', 'is', null),
      )
      const assigned = where.exists(
        where
          .selectFrom('engagement_consultant')
          .select('person_id')
          .whereRef('engagement_consultant.engagement_id', '=', 'engagement.id')
          .where('engagement_consultant.person_id', '=', reach.consultantPersonId)
          .where('engagement_consultant.removed_at', 'is', null),
      )
      return where.or([
        where('engagement.company_id', 'in', [...reach.companyIds]),
        where.and([where('engagement.company_id', 'in', [...reach.onCompanyIds]), on]),
        assigned,
      ])
    })
    .execute()
}

export async function nextEngagementNumber(tx: Tx): Promise<number> {
  const row = await tx
    .selectFrom('engagement')
    .select((select) => select.fn.max('number').as('last'))
    .executeTakeFirst()
  return (row?.last ?? 0) + 1
}

export async function insertEngagement(tx: Tx, engagement: Insertable<EngagementTable>): Promise<void> {
  await tx.insertInto('engagement').values(engagement).execute()
}

export async function setEngagementStatus(
  tx: Tx,
  engagementId: string,
  status: EngagementStatus,
): Promise<void> {
  await tx.updateTable('engagement').set({ status }).where('id', '=', engagementId).execute()
}
