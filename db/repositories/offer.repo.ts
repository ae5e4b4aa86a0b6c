import 'server-only'
import type { Selectable } from 'kysely'

import type { Db } from '@/db/client'
import type { BlockOfferTable } from '@/db/tables/billing'

export type OfferRow = Selectable<BlockOfferTable>

/** The blocks on sale, smallest first. */
export function listOffers(db: Db): Promise<OfferRow[]> {
  return db
    .selectFrom('block_offer')
    .selectAll()
    .where('archived_at', 'is', null)
    .orderBy('minutes')
    .execute()
}

export function findOffer(db: Db, offerId: string): Promise<OfferRow | undefined> {
  return db
    .selectFrom('block_offer')
    .selectAll()
    .where('id', '=', offerId)
    .where('archived_at', 'is', null)
    .executeTakeFirst()
}
