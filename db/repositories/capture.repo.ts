import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { CaptureChannelTable, CaptureTable } from '@/db/tables/evidence'

export type CaptureRow = Selectable<CaptureTable>
export type CaptureChannelRow = Selectable<CaptureChannelTable>

export async function insertCapture(
  tx: Tx,
  capture: Insertable<CaptureTable>,
  channels: readonly Insertable<CaptureChannelTable>[],
): Promise<void> {
  await tx.insertInto('capture').values(capture).execute()
  await tx
    .insertInto('capture_channel')
    .values([...channels])
    .execute()
}

export function findCapture(db: Db | Tx, evidenceId: string): Promise<CaptureRow | undefined> {
  return db.selectFrom('capture').selectAll().where('evidence_id', '=', evidenceId).executeTakeFirst()
}

export function listCaptureChannels(db: Db | Tx, evidenceId: string): Promise<CaptureChannelRow[]> {
  return db
    .selectFrom('capture_channel')
    .selectAll()
    .where('evidence_id', '=', evidenceId)
    .orderBy('position')
    .execute()
}
