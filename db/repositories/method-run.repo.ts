import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { MethodRunEvidenceTable, MethodRunTable } from '@/db/tables/findings'

export type RunListRow = Omit<Selectable<MethodRunTable>, 'figures'> & { readonly creator: string }
export type RunRow = Selectable<MethodRunTable> & { readonly creator: string }

/** A piece of evidence that a run rests on, with the hash that its bytes had then. */
export type RunEvidenceRow = {
  readonly run_id: string
  readonly evidence_id: string
  readonly sha256: string
  readonly number: number
  readonly name: string
}

const listColumns = [
  'method_run.id',
  'method_run.engagement_id',
  'method_run.number',
  'method_run.method_id',
  'method_run.method_version',
  'method_run.inputs',
  'method_run.result',
  'method_run.created_by',
  'method_run.created_at',
  'person.name as creator',
] as const

const withCreator = (db: Db | Tx) =>
  db
    .selectFrom('method_run')
    .innerJoin('person', 'person.id', 'method_run.created_by')
    .select([...listColumns])

export function findRun(db: Db | Tx, runId: string): Promise<RunRow | undefined> {
  return withCreator(db).select('method_run.figures').where('method_run.id', '=', runId).executeTakeFirst()
}

/** Newest first, without their figures. */
export function listRunsOf(db: Db | Tx, engagementId: string): Promise<RunListRow[]> {
  return withCreator(db)
    .where('method_run.engagement_id', '=', engagementId)
    .orderBy('method_run.number', 'desc')
    .execute()
}

export async function nextRunNumber(tx: Tx, engagementId: string): Promise<number> {
  const row = await tx
    .selectFrom('method_run')
    .select((select) => select.fn.max('number').as('last'))
    .where('engagement_id', '=', engagementId)
    .executeTakeFirst()
  return (row?.last ?? 0) + 1
}

export async function insertRun(
  tx: Tx,
  run: Insertable<MethodRunTable>,
  evidence: readonly Omit<Insertable<MethodRunEvidenceTable>, 'run_id'>[],
): Promise<void> {
  await tx.insertInto('method_run').values(run).execute()
  for (const { evidence_id, sha256 } of evidence) {
    await tx.insertInto('method_run_evidence').values({ run_id: run.id, evidence_id, sha256 }).execute()
  }
}

export async function listRunEvidence(db: Db | Tx, runIds: readonly string[]): Promise<RunEvidenceRow[]> {
  if (runIds.length === 0) return []
  return db
    .selectFrom('method_run_evidence')
    .innerJoin('evidence', 'evidence.id', 'method_run_evidence.evidence_id')
    .where('method_run_evidence.run_id', 'in', [...runIds])
    .orderBy('evidence.number')
    .select([
      'method_run_evidence.run_id',
      'method_run_evidence.evidence_id',
      'method_run_evidence.sha256',
      'evidence.number',
      'evidence.name',
    ])
    .execute()
}
