import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { OutboxMessageTable } from '@/db/tables/outbox'

export type OutboxRow = Selectable<OutboxMessageTable>

/** Queues a message once: a second one under the same key changes nothing. */
export async function insertOutboxMessage(tx: Tx, message: Insertable<OutboxMessageTable>): Promise<void> {
  await tx
    .insertInto('outbox_message')
    .values(message)
    .onConflict((conflict) => conflict.column('dedupe_key').doNothing())
    .execute()
}

export function listDueMessages(db: Db, now: number, limit: number): Promise<OutboxRow[]> {
  return db
    .selectFrom('outbox_message')
    .selectAll()
    .where('sent_at', 'is', null)
    .where('next_attempt_at', '<=', now)
    .orderBy('next_attempt_at')
    .limit(limit)
    .execute()
}

/** A message that is out loses its text: it may hold a link that lets somebody in. */
export async function markMessageSent(db: Db, id: string, at: number): Promise<void> {
  await db.updateTable('outbox_message').set({ sent_at: at, payload: '{}' }).where('id', '=', id).execute()
}

export async function markMessageFailed(
  db: Db,
  id: string,
  failure: { readonly attempts: number; readonly nextAttemptAt: number; readonly error: string },
): Promise<void> {
  await db
    .updateTable('outbox_message')
    .set({
      attempts: failure.attempts,
      next_attempt_at: failure.nextAttemptAt,
      last_error: failure.error,
    })
    .where('id', '=', id)
    .execute()
}
