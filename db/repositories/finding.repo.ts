import 'server-only'
import type { Insertable, Selectable, Updateable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { FindingActionTable, FindingTable } from '@/db/tables/findings'

export type FindingRow = Selectable<FindingTable> & { readonly author: string }
export type FindingActionRow = Selectable<FindingActionTable>

const withAuthor = (db: Db | Tx) =>
  db
    .selectFrom('finding')
    .innerJoin('person', 'person.id', 'finding.author_id')
    .selectAll('finding')
    .select('person.name as author')

export function findFinding(db: Db | Tx, findingId: string): Promise<FindingRow | undefined> {
  return withAuthor(db).where('finding.id', '=', findingId).executeTakeFirst()
}

export function listFindingsOf(db: Db | Tx, engagementId: string): Promise<FindingRow[]> {
  return withAuthor(db).where('finding.engagement_id', '=', engagementId).orderBy('finding.number').execute()
}

export async function nextFindingNumber(tx: Tx, engagementId: string): Promise<number> {
  const row = await tx
    .selectFrom('finding')
    .select((select) => select.fn.max('number').as('last'))
    .where('engagement_id', '=', engagementId)
    .executeTakeFirst()
  return (row?.last ?? 0) + 1
}

export async function insertFinding(tx: Tx, finding: Insertable<FindingTable>): Promise<void> {
  await tx.insertInto('finding').values(finding).execute()
}

export async function updateFinding(
  tx: Tx,
  findingId: string,
  change: Updateable<FindingTable>,
): Promise<void> {
  await tx.updateTable('finding').set(change).where('id', '=', findingId).execute()
}

/** The runs of a finding in their order. */
export async function listFindingRunIds(db: Db | Tx, findingId: string): Promise<string[]> {
  const rows = await db
    .selectFrom('finding_run')
    .select('run_id')
    .where('finding_id', '=', findingId)
    .orderBy('position')
    .execute()
  return rows.map((row) => row.run_id)
}

export async function replaceFindingRuns(
  tx: Tx,
  findingId: string,
  runIds: readonly string[],
): Promise<void> {
  await tx.deleteFrom('finding_run').where('finding_id', '=', findingId).execute()
  for (const [position, run_id] of runIds.entries()) {
    await tx.insertInto('finding_run').values({ finding_id: findingId, run_id, position }).execute()
  }
}

export function listFindingActions(db: Db | Tx, findingId: string): Promise<FindingActionRow[]> {
  return db
    .selectFrom('finding_action')
    .selectAll()
    .where('finding_id', '=', findingId)
    .orderBy('position')
    .execute()
}

export async function replaceFindingActions(
  tx: Tx,
  findingId: string,
  actions: readonly Insertable<FindingActionTable>[],
): Promise<void> {
  await tx.deleteFrom('finding_action').where('finding_id', '=', findingId).execute()
  for (const action of actions) await tx.insertInto('finding_action').values(action).execute()
}

/** Whether a run stands in a finding that the client may read. */
export async function isRunPublished(db: Db | Tx, runId: string): Promise<boolean> {
  const row = await db
    .selectFrom('finding_run')
    .innerJoin('finding', 'finding.id', 'finding_run.finding_id')
    .where('finding_run.run_id', '=', runId)
    .where('finding.status', '=', 'published')
    .select('finding.id')
    .executeTakeFirst()
  return row !== undefined
}
