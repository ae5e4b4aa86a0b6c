import 'server-only'
import type { Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
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

/** The whole catalogue, also what was taken off sale, smallest first. */
export function listCatalogue(db: Db): Promise<OfferRow[]> {
  return db.selectFrom('block_offer').selectAll().orderBy('minutes').orderBy('created_at').execute()
}

export function findOffer(db: Db | Tx, offerId: string): Promise<OfferRow | undefined> {
  return db
    .selectFrom('block_offer')
    .selectAll()
    .where('id', '=', offerId)
    .where('archived_at', 'is', null)
    .executeTakeFirst()
}
