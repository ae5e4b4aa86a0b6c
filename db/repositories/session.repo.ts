import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { SessionTable } from '@/db/tables/identity'

export type SessionRow = Selectable<SessionTable>

export async function insertSession(db: Db, session: Insertable<SessionTable>): Promise<void> {
  await db.insertInto('session').values(session).execute()
}

export function findSession(db: Db, idHash: string): Promise<SessionRow | undefined> {
  return db.selectFrom('session').selectAll().where('id_hash', '=', idHash).executeTakeFirst()
}

export async function touchSession(db: Db, idHash: string, at: number): Promise<void> {
  await db.updateTable('session').set({ last_seen_at: at }).where('id_hash', '=', idHash).execute()
}

export async function endSession(db: Db, idHash: string, at: number): Promise<void> {
  await db
    .updateTable('session')
    .set({ ended_at: at })
    .where('id_hash', '=', idHash)
    .where('ended_at', 'is', null)
    .execute()
}

export async function endSessionsOf(db: Db | Tx, personId: string, at: number): Promise<void> {
  await db
    .updateTable('session')
    .set({ ended_at: at })
    .where('person_id', '=', personId)
    .where('ended_at', 'is', null)
    .execute()
}
