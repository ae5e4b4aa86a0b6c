import 'server-only'
import type { Insertable } from 'kysely'

import type { Tx } from '@/db/client'
import type { ProviderEventTable } from '@/db/tables/billing'

export async function hasProviderEvent(tx: Tx, eventId: string): Promise<boolean> {
  const row = await tx.selectFrom('provider_event').select('id').where('id', '=', eventId).executeTakeFirst()
  return row !== undefined
}

export async function insertProviderEvent(tx: Tx, event: Insertable<ProviderEventTable>): Promise<void> {
  await tx.insertInto('provider_event').values(event).execute()
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
