import 'server-only'

import type { Db, Tx } from '@/db/client'

export type PersonOnEngagement = { readonly personId: string; readonly name: string; readonly since: number }

/** A person on an engagement, with what to write when they join or come back. */
export type Joining = { readonly engagementId: string; readonly personId: string; readonly at: number }

export function listClientsOn(db: Db | Tx, engagementId: string): Promise<PersonOnEngagement[]> {
  return db
    .selectFrom('engagement_client')
    .innerJoin('person', 'person.id', 'engagement_client.person_id')
    .where('engagement_client.engagement_id', '=', engagementId)
    .where('engagement_client.removed_at', 'is', null)
    .where('person.disabled_at', 'is', null)
    .orderBy('person.name')
    .select(['person.id as personId', 'person.name', 'engagement_client.added_at as since'])
    .execute()
}

export function listConsultantsOn(db: Db | Tx, engagementId: string): Promise<PersonOnEngagement[]> {
  return db
    .selectFrom('engagement_consultant')
    .innerJoin('person', 'person.id', 'engagement_consultant.person_id')
    .where('engagement_consultant.engagement_id', '=', engagementId)
    .where('engagement_consultant.removed_at', 'is', null)
    .where('person.disabled_at', 'is', null)
    .orderBy('person.name')
    .select(['person.id as personId', 'person.name', 'engagement_consultant.assigned_at as since'])
    .execute()
}

export async function putClientOn(tx: Tx, { engagementId, personId, at }: Joining): Promise<void> {
  await tx
    .insertInto('engagement_client')
    .values({ engagement_id: engagementId, person_id: personId, added_at: at, removed_at: null })
    .onConflict((conflict) =>
      conflict.columns(['engagement_id', 'person_id']).doUpdateSet({ removed_at: null }),
    )
    .execute()
}

export async function takeClientOff(tx: Tx, { engagementId, personId, at }: Joining): Promise<void> {
  await tx
    .updateTable('engagement_client')
    .set({ removed_at: at })
    .where('engagement_id', '=', engagementId)
    .where('person_id', '=', personId)
    .where('removed_at', 'is', null)
    .execute()
}

export async function putConsultantOn(tx: Tx, { engagementId, personId, at }: Joining): Promise<void> {
  await tx
    .insertInto('engagement_consultant')
    .values({ engagement_id: engagementId, person_id: personId, assigned_at: at, removed_at: null })
    .onConflict((conflict) =>
      conflict.columns(['engagement_id', 'person_id']).doUpdateSet({ removed_at: null }),
    )
    .execute()
}

export async function takeConsultantOff(tx: Tx, { engagementId, personId, at }: Joining): Promise<void> {
  await tx
    .updateTable('engagement_consultant')
    .set({ removed_at: at })
    .where('engagement_id', '=', engagementId)
    .where('person_id', '=', personId)
    .where('removed_at', 'is', null)
    .execute()
}
