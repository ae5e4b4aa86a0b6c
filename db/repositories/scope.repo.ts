import 'server-only'
import type { Insertable, Selectable, Updateable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { ScopeStatus, ScopeTable } from '@/db/tables/engagements'

export type ScopeRow = Selectable<ScopeTable>

/** All versions, newest first, with the names of those who wrote and decided them. */
export function listScopes(db: Db | Tx, engagementId: string) {
  return db
    .selectFrom('scope')
    .innerJoin('person as author', 'author.id', 'scope.author_id')
    .leftJoin('person as decider', 'decider.id', 'scope.decided_by')
    .where('scope.engagement_id', '=', engagementId)
    .orderBy('scope.version', 'desc')
    .selectAll('scope')
    .select(['author.name as author_name', 'decider.name as decider_name'])
    .execute()
}

export function findScope(db: Db | Tx, scopeId: string): Promise<ScopeRow | undefined> {
  return db.selectFrom('scope').selectAll().where('id', '=', scopeId).executeTakeFirst()
}

export function findScopeWithStatus(
  db: Db | Tx,
  engagementId: string,
  status: ScopeStatus,
): Promise<ScopeRow | undefined> {
  return db
    .selectFrom('scope')
    .selectAll()
    .where('engagement_id', '=', engagementId)
    .where('status', '=', status)
    .orderBy('version', 'desc')
    .executeTakeFirst()
}

export async function nextScopeVersion(tx: Tx, engagementId: string): Promise<number> {
  const row = await tx
    .selectFrom('scope')
    .select((select) => select.fn.max('version').as('last'))
    .where('engagement_id', '=', engagementId)
    .executeTakeFirst()
  return (row?.last ?? 0) + 1
}

export async function insertScope(tx: Tx, scope: Insertable<ScopeTable>): Promise<void> {
  await tx.insertInto('scope').values(scope).execute()
}

export async function updateScope(tx: Tx, scopeId: string, change: Updateable<ScopeTable>): Promise<void> {
  await tx.updateTable('scope').set(change).where('id', '=', scopeId).execute()
}

/** Puts every version of one status out of play. */
export async function supersedeScopes(tx: Tx, engagementId: string, status: ScopeStatus): Promise<void> {
  await tx
    .updateTable('scope')
    .set({ status: 'superseded' })
    .where('engagement_id', '=', engagementId)
    .where('status', '=', status)
    .execute()
}
