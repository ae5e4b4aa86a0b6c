import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { PaymentTable } from '@/db/tables/billing'

export type PaymentRow = Selectable<PaymentTable>

/** What the provider booked for a payment: grossCents = feeCents + netCents. */
export type Booking = {
  readonly id: string
  readonly grossCents: number
  readonly feeCents: number
  readonly netCents: number
  readonly currency: string
}

export async function insertPayment(tx: Tx, payment: Insertable<PaymentTable>): Promise<void> {
  await tx.insertInto('payment').values(payment).execute()
}

export function listPayments(db: Db): Promise<PaymentRow[]> {
  return db.selectFrom('payment').selectAll().execute()
}

/** Payments whose fee the provider has not told us yet. */
export function listUnsettledPayments(db: Db): Promise<PaymentRow[]> {
  return db
    .selectFrom('payment')
    .selectAll()
    .where('balance_transaction_id', 'is', null)
    .orderBy('created_at')
    .execute()
}

export async function settlePayment(db: Db, paymentId: string, booked: Booking): Promise<void> {
  await db
    .updateTable('payment')
    .set({
      balance_transaction_id: booked.id,
      settled_cents: booked.grossCents,
      settled_currency: booked.currency,
      fee_cents: booked.feeCents,
      net_cents: booked.netCents,
    })
    .where('id', '=', paymentId)
    .execute()
}
