import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { ProviderEventOutcome, ProviderEventTable } from '@/db/tables/billing'

export type ProviderEventRow = Selectable<ProviderEventTable>

export async function hasProviderEvent(tx: Tx, eventId: string): Promise<boolean> {
  const row = await tx.selectFrom('provider_event').select('id').where('id', '=', eventId).executeTakeFirst()
  return row !== undefined
}

export async function insertProviderEvent(tx: Tx, event: Insertable<ProviderEventTable>): Promise<void> {
  await tx.insertInto('provider_event').values(event).execute()
}

export function listEvents(
  db: Db,
  which: { readonly outcome: ProviderEventOutcome } | { readonly types: readonly string[] },
): Promise<ProviderEventRow[]> {
  const query = db.selectFrom('provider_event').selectAll().orderBy('received_at', 'desc')
  return 'outcome' in which
    ? query.where('outcome', '=', which.outcome).execute()
    : query.where('type', 'in', [...which.types]).execute()
}

export async function hasEffect(db: Db, objectId: string, effect: string): Promise<boolean> {
  const row = await db
    .selectFrom('provider_effect')
    .select('event_id')
    .where('object_id', '=', objectId)
    .where('effect', '=', effect)
    .executeTakeFirst()
  return row !== undefined
}

/** @returns false when this effect on this object was had before, by whichever event. */
export async function claimEffect(
  tx: Tx,
  effect: { readonly objectId: string; readonly effect: string; readonly eventId: string },
): Promise<boolean> {
  const result = await tx
    .insertInto('provider_effect')
    .values({ object_id: effect.objectId, effect: effect.effect, event_id: effect.eventId })
    .onConflict((conflict) => conflict.doNothing())
    .executeTakeFirst()
  return result.numInsertedOrUpdatedRows === 1n
}
