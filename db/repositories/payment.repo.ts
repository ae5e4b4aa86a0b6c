import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { PaymentTable } from '@/db/tables/billing'

export type PaymentRow = Selectable<PaymentTable>

export async function insertPayment(tx: Tx, payment: Insertable<PaymentTable>): Promise<void> {
  await tx.insertInto('payment').values(payment).execute()
}

export function listPayments(db: Db): Promise<PaymentRow[]> {
  return db.selectFrom('payment').selectAll().execute()
}

/** Payments whose fee the provider has not told us yet. */
export function listUnsettledPayments(db: Db): Promise<PaymentRow[]> {
  return db.selectFrom('payment').selectAll().where('balance_transaction_id', 'is', null).execute()
}

export async function settlePayment(
  db: Db,
  paymentId: string,
  settled: { readonly balanceTransactionId: string; readonly feeCents: number; readonly netCents: number },
): Promise<void> {
  await db
    .updateTable('payment')
    .set({
      balance_transaction_id: settled.balanceTransactionId,
      fee_cents: settled.feeCents,
      net_cents: settled.netCents,
    })
    .where('id', '=', paymentId)
    .execute()
}
