import type { Result } from '@/lib/core/result'

export type CheckoutOrder = {
  /** Our purchase; comes back as the reference of the checkout. */
  readonly orderId: string
  readonly companyId: string
  readonly customerEmail: string
  readonly blockTitle: string
  /** The whole price of one block, tax included, in the smallest unit of the currency. */
  readonly unitAmountCents: number
  /** ISO 4217, such as EUR. */
  readonly currency: string
  /** May hold {CHECKOUT_SESSION_ID}, which the provider replaces. */
  readonly successUrl: string
  readonly cancelUrl: string
  /** Stored with the order and used again on every retry, so that one order never has two checkouts. */
  readonly idempotencyKey: string
}

/** A checkout as the provider holds it: what was really paid, to be compared with our order. */
export type Checkout = {
  readonly sessionId: string
  readonly status: 'open' | 'complete' | 'expired'
  readonly paymentStatus: 'paid' | 'unpaid' | 'no_payment_required'
  readonly amountTotalCents: number | null
  readonly currency: string | null
  readonly customerEmail: string | null
  readonly customerId: string | null
  readonly paymentIntentId: string | null
  readonly orderId: string | null
  readonly metadata: Readonly<Record<string, string>>
}

/** What one payment leaves after the provider's fee: grossCents = feeCents + netCents. */
export type BalanceTransaction = {
  readonly id: string
  readonly grossCents: number
  readonly feeCents: number
  readonly netCents: number
  readonly currency: string
}

export type PayoutTransaction = BalanceTransaction & {
  /** charge, refund, adjustment, payout or another word of the provider. */
  readonly type: string
  /** The charge, refund or payout that it stems from. */
  readonly sourceId: string | null
}

export type Charge = {
  readonly chargeId: string
  readonly paymentIntentId: string | null
  readonly amountCents: number
  /** All that was ever returned of it, not only by the last refund. */
  readonly refundedCents: number
  readonly currency: string
}

export type Dispute = {
  readonly disputeId: string
  readonly chargeId: string
  readonly paymentIntentId: string | null
  readonly amountCents: number
  readonly currency: string
  readonly reason: string
  /** The provider's word for where it stands; `won` and `lost` are final. */
  readonly status: string
}

export type Payout = {
  readonly payoutId: string
  readonly amountCents: number
  readonly currency: string
  readonly status: string
  readonly arrivesAt: number
}

export type Refund = {
  readonly refundId: string
  readonly amountCents: number
  readonly currency: string
  readonly status: string
}

export type ProviderObject =
  | {
      readonly kind:
        'checkout_completed' | 'checkout_paid_later' | 'checkout_failed_later' | 'checkout_expired'
      readonly checkout: Checkout
    }
  | { readonly kind: 'charge_refunded'; readonly charge: Charge }
  | { readonly kind: 'dispute_opened' | 'dispute_closed'; readonly dispute: Dispute }
  | { readonly kind: 'payout_paid'; readonly payout: Payout }
  | { readonly kind: 'unknown' }

export type ProviderEvent = {
  readonly id: string
  /** The provider's name of the event, kept also for kinds that have no effect here. */
  readonly type: string
  readonly createdAt: number
  /** The id of the object that the event is about, where it has one. */
  readonly objectId: string | null
  readonly object: ProviderObject
}

export type PaymentsError = {
  /**
   * not_reachable: no answer, a busy provider or a broken one; the same call may be made again with the same key.
   * not_found: the provider does not know the object. refused: it does not accept the request.
   * not_settled: the payment has no balance transaction yet. unexpected_reply: the answer makes no sense to us.
   */
  readonly code: 'not_reachable' | 'not_found' | 'refused' | 'not_settled' | 'unexpected_reply'
  readonly message: string
}

export type EventRefusal = 'invalid_signature' | 'too_old' | 'in_future' | 'malformed'

type Answer<T> = Promise<Result<T, PaymentsError>>

/** Card payments by a hosted provider. Every answer has been checked for its shape; amounts are not yet compared. */
export type Payments = {
  readonly createCheckout: (
    order: CheckoutOrder,
  ) => Answer<{ readonly sessionId: string; readonly url: string }>
  readonly getCheckout: (sessionId: string) => Answer<Checkout>
  readonly getBalanceTransaction: (paymentIntentId: string) => Answer<BalanceTransaction>
  readonly refundPayment: (refund: {
    readonly paymentIntentId: string
    readonly amountCents: number
    readonly idempotencyKey: string
  }) => Answer<Refund>
  /** Payouts to the practice's bank account that were created at or after an instant, newest first. */
  readonly listPayouts: (since: number) => Answer<readonly Payout[]>
  /** Which payments, refunds and fees one payout to the bank is made of. */
  readonly listPayoutTransactions: (payoutId: string) => Answer<readonly PayoutTransaction[]>
  /** Events of which no delivery to us succeeded, newest first; the provider keeps 30 days. */
  readonly listUndeliveredEvents: (since: number) => Answer<readonly ProviderEvent[]>
  /**
   * Checks a delivery before anything else reads it: signature over the raw body, at most 300 s old and at most 300 s
   * ahead of `now`, then its shape.
   */
  readonly verifyEvent: (
    rawBody: string,
    signatureHeader: string | null,
    now: number,
  ) => Result<ProviderEvent, EventRefusal>
}
