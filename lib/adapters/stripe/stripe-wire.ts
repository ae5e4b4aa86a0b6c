import { z } from 'zod'

import type {
  BalanceTransaction,
  Charge,
  Checkout,
  Dispute,
  Payout,
  PayoutTransaction,
  Refund,
} from '@/lib/ports/payments'

const instant = z.int().transform((seconds) => seconds * 1000)
const currency = z
  .string()
  .length(3)
  .transform((code) => code.toUpperCase())

/** A reference that arrives as an id or, where we asked for it, as the object itself. */
const reference = z.union([z.string(), z.object({ id: z.string() }).transform((object) => object.id)])

export const newCheckout = z
  .object({ id: z.string().min(1), url: z.url() })
  .transform(({ id, url }) => ({ sessionId: id, url }))

export const checkout = z
  .object({
    object: z.literal('checkout.session'),
    id: z.string().min(1),
    status: z.enum(['open', 'complete', 'expired']),
    payment_status: z.enum(['paid', 'unpaid', 'no_payment_required']),
    amount_total: z.int().nullable(),
    currency: currency.nullable(),
    customer_email: z.string().nullable(),
    customer: reference.nullable(),
    payment_intent: reference.nullable(),
    client_reference_id: z.string().nullable(),
    metadata: z.record(z.string(), z.string()).nullable(),
  })
  .transform((session): Checkout => ({
    sessionId: session.id,
    status: session.status,
    paymentStatus: session.payment_status,
    amountTotalCents: session.amount_total,
    currency: session.currency,
    customerEmail: session.customer_email,
    customerId: session.customer,
    paymentIntentId: session.payment_intent,
    orderId: session.client_reference_id,
    metadata: session.metadata ?? {},
  }))

const balanceFields = z
  .object({
    object: z.literal('balance_transaction'),
    id: z.string().min(1),
    amount: z.int(),
    fee: z.int(),
    net: z.int(),
    currency,
    type: z.string(),
    source: reference.nullable(),
  })
  .refine((entry) => entry.amount === entry.fee + entry.net, 'amount is not fee + net')

const amountsOf = (entry: z.infer<typeof balanceFields>): BalanceTransaction => ({
  id: entry.id,
  grossCents: entry.amount,
  feeCents: entry.fee,
  netCents: entry.net,
  currency: entry.currency,
})

export const payoutTransaction = balanceFields.transform((entry): PayoutTransaction => ({
  ...amountsOf(entry),
  type: entry.type,
  sourceId: entry.source,
}))

/** A payment intent with its charge and balance transaction expanded; null while the money has not settled. */
export const settledPayment = z
  .object({
    latest_charge: z
      .object({ balance_transaction: balanceFields.transform(amountsOf).nullable() })
      .nullable(),
  })
  .transform((intent) => intent.latest_charge?.balance_transaction ?? null)

export const charge = z
  .object({
    object: z.literal('charge'),
    id: z.string().min(1),
    payment_intent: reference.nullable(),
    amount: z.int(),
    amount_refunded: z.int(),
    currency,
  })
  .transform((entry): Charge => ({
    chargeId: entry.id,
    paymentIntentId: entry.payment_intent,
    amountCents: entry.amount,
    refundedCents: entry.amount_refunded,
    currency: entry.currency,
  }))

export const dispute = z
  .object({
    object: z.literal('dispute'),
    id: z.string().min(1),
    charge: reference,
    payment_intent: reference.nullable(),
    amount: z.int(),
    currency,
    reason: z.string(),
    status: z.string(),
  })
  .transform((entry): Dispute => ({
    disputeId: entry.id,
    chargeId: entry.charge,
    paymentIntentId: entry.payment_intent,
    amountCents: entry.amount,
    currency: entry.currency,
    reason: entry.reason,
    status: entry.status,
  }))

export const payout = z
  .object({
    object: z.literal('payout'),
    id: z.string().min(1),
    amount: z.int(),
    currency,
    status: z.string(),
    arrival_date: instant,
  })
  .transform((entry): Payout => ({
    payoutId: entry.id,
    amountCents: entry.amount,
    currency: entry.currency,
    status: entry.status,
    arrivesAt: entry.arrival_date,
  }))

export const refund = z
  .object({ id: z.string().min(1), amount: z.int(), currency, status: z.string().nullable() })
  .transform((entry): Refund => ({
    refundId: entry.id,
    amountCents: entry.amount,
    currency: entry.currency,
    status: entry.status ?? 'pending',
  }))
