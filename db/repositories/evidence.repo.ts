import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { EvidenceTable } from '@/db/tables/evidence'

export type EvidenceRow = Selectable<EvidenceTable> & { readonly uploader: string }

const withUploader = (db: Db | Tx) =>
  db
    .selectFrom('evidence')
    .innerJoin('person', 'person.id', 'evidence.uploaded_by')
    .selectAll('evidence')
    .select('person.name as uploader')

export function findEvidence(db: Db | Tx, evidenceId: string): Promise<EvidenceRow | undefined> {
  return withUploader(db).where('evidence.id', '=', evidenceId).executeTakeFirst()
}

export function listEvidenceOf(db: Db | Tx, engagementId: string): Promise<EvidenceRow[]> {
  return withUploader(db)
    .where('evidence.engagement_id', '=', engagementId)
    .orderBy('evidence.number', 'desc')
    .execute()
}

/** How many files an engagement holds and how many bytes they have together. */
export async function evidenceUsage(
  db: Db | Tx,
  engagementId: string,
): Promise<{ readonly files: number; readonly bytes: number; readonly lastNumber: number }> {
  const row = await db
    .selectFrom('evidence')
    .where('engagement_id', '=', engagementId)
    .select((select) => [
      select.fn.countAll<number>().as('files'),
      select.fn.sum<number | null>('size_bytes').as('bytes'),
      select.fn.max('number').as('lastNumber'),
    ])
    .executeTakeFirstOrThrow()
  return { files: row.files, bytes: row.bytes ?? 0, lastNumber: row.lastNumber ?? 0 }
}

export async function insertEvidence(tx: Tx, evidence: Insertable<EvidenceTable>): Promise<void> {
  await tx.insertInto('evidence').values(evidence).execute()
}

export async function markEvidenceReady(tx: Tx, evidenceId: string): Promise<void> {
  await tx.updateTable('evidence').set({ status: 'ready' }).where('id', '=', evidenceId).execute()
}

export async function markEvidenceRefused(tx: Tx, evidenceId: string, refusal: string): Promise<void> {
  await tx.updateTable('evidence').set({ status: 'refused', refusal }).where('id', '=', evidenceId).execute()
}

/** Captures whose check was cut off, for example by a restart. */
export function listUncheckedEvidence(db: Db): Promise<{ id: string }[]> {
  return db.selectFrom('evidence').select('id').where('status', '=', 'checking').execute()
}
