import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { BriefTable, KnownOscillatorTable } from '@/db/tables/engagements'

export type BriefRow = Selectable<BriefTable>
export type KnownOscillatorRow = Selectable<KnownOscillatorTable>

export async function insertBrief(
  tx: Tx,
  brief: Insertable<BriefTable>,
  oscillators: readonly Insertable<KnownOscillatorTable>[],
): Promise<void> {
  await tx.insertInto('brief').values(brief).execute()
  if (oscillators.length > 0)
    await tx
      .insertInto('known_oscillator')
      .values([...oscillators])
      .execute()
}

export function findBrief(db: Db | Tx, engagementId: string): Promise<BriefRow | undefined> {
  return db.selectFrom('brief').selectAll().where('engagement_id', '=', engagementId).executeTakeFirst()
}

export function listKnownOscillators(db: Db | Tx, engagementId: string): Promise<KnownOscillatorRow[]> {
  return db
    .selectFrom('known_oscillator')
    .selectAll()
    .where('engagement_id', '=', engagementId)
    .orderBy('position')
    .execute()
}
