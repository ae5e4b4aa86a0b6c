import 'server-only'
import type { Insertable, Selectable, Updateable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { PurchaseStatus, PurchaseTable } from '@/db/tables/billing'

export type PurchaseRow = Selectable<PurchaseTable>

export async function insertPurchase(tx: Tx, purchase: Insertable<PurchaseTable>): Promise<void> {
  await tx.insertInto('purchase').values(purchase).execute()
}

export function findPurchase(db: Db | Tx, purchaseId: string): Promise<PurchaseRow | undefined> {
  return db.selectFrom('purchase').selectAll().where('id', '=', purchaseId).executeTakeFirst()
}

/** The latest open purchase of one offer for which the provider has not named a checkout yet. */
export function findPurchaseWithoutSession(
  tx: Tx,
  whose: { readonly companyId: string; readonly personId: string; readonly offerId: string },
): Promise<PurchaseRow | undefined> {
  return tx
    .selectFrom('purchase')
    .selectAll()
    .where('company_id', '=', whose.companyId)
    .where('person_id', '=', whose.personId)
    .where('offer_id', '=', whose.offerId)
    .where('status', '=', 'open')
    .where('session_id', 'is', null)
    .orderBy('created_at', 'desc')
    .executeTakeFirst()
}

export function listPurchasesOf(db: Db, companyId: string): Promise<PurchaseRow[]> {
  return db
    .selectFrom('purchase')
    .selectAll()
    .where('company_id', '=', companyId)
    .orderBy('created_at', 'desc')
    .execute()
}

export function listPurchases(db: Db): Promise<(PurchaseRow & { company_name: string })[]> {
  return db
    .selectFrom('purchase')
    .innerJoin('company', 'company.id', 'purchase.company_id')
    .orderBy('purchase.created_at', 'desc')
    .selectAll('purchase')
    .select('company.name as company_name')
    .execute()
}

/** Notes the provider's checkout once; the event that reports its payment may have done so before. */
export async function setSession(tx: Tx, purchaseId: string, sessionId: string): Promise<void> {
  await tx
    .updateTable('purchase')
    .set({ session_id: sessionId })
    .where('id', '=', purchaseId)
    .where('session_id', 'is', null)
    .execute()
}

/** @returns false when the purchase no longer stands in one of the given states. */
export async function movePurchase(
  tx: Tx,
  purchaseId: string,
  from: readonly PurchaseStatus[],
  change: Updateable<PurchaseTable>,
): Promise<boolean> {
  const result = await tx
    .updateTable('purchase')
    .set(change)
    .where('id', '=', purchaseId)
    .where('status', 'in', [...from])
    .executeTakeFirst()
  return result.numUpdatedRows === 1n
}

/** Receipts are numbered from 1 without gaps: taken inside the transaction that pays. */
export async function nextReceiptNumber(tx: Tx): Promise<number> {
  const row = await tx
    .selectFrom('purchase')
    .select((select) => select.fn.max('receipt_number').as('last'))
    .executeTakeFirst()
  return (row?.last ?? 0) + 1
}
