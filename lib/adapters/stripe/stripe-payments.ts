import Stripe from 'stripe'
import { z } from 'zod'

import { err } from '@/lib/core/result'
import type { CheckoutOrder, Payments } from '@/lib/ports/payments'

import { askStripe } from './ask-stripe'
import { providerEvent } from './provider-event'
import { checkout, newCheckout, payout, payoutTransaction, refund, settledPayment } from './stripe-wire'
import { verifyEvent } from './verify-event'

export type StripeSettings = {
  readonly secretKey: string
  readonly webhookSecret: string
  /** Another address that speaks the same interface; the real service when absent. */
  readonly apiBase?: URL
  readonly timeoutMilliseconds?: number
  readonly retries?: number
}

/** A person waits for the answer: 8 s and one more try, then the page says that the provider does not answer. */
const patience = { timeoutMilliseconds: 8_000, retries: 1 }

/** The most rows that one list brings; the practice's month is far below it. */
const longestList = 1_000

export function createStripePayments(settings: StripeSettings): Payments {
  const stripe = clientOf(settings)
  return {
    createCheckout: (order) =>
      askStripe(newCheckout, () =>
        stripe.checkout.sessions.create(sessionParameters(order), { idempotencyKey: order.idempotencyKey }),
      ),
    getCheckout: (sessionId) => askStripe(checkout, () => stripe.checkout.sessions.retrieve(sessionId)),
    getBalanceTransaction: async (paymentIntentId) => {
      const settled = await askStripe(settledPayment, () =>
        stripe.paymentIntents.retrieve(paymentIntentId, { expand: ['latest_charge.balance_transaction'] }),
      )
      if (!settled.ok) return settled
      return settled.value === null ? err(notSettled) : { ok: true, value: settled.value }
    },
    refundPayment: ({ paymentIntentId, amountCents, idempotencyKey }) =>
      askStripe(refund, () =>
        stripe.refunds.create({ payment_intent: paymentIntentId, amount: amountCents }, { idempotencyKey }),
      ),
    listPayouts: (since) =>
      askStripe(z.array(payout), () =>
        stripe.payouts.list({ created: from(since), limit: 100 }).autoPagingToArray({ limit: longestList }),
      ),
    listPayoutTransactions: (payoutId) =>
      askStripe(z.array(payoutTransaction), () =>
        stripe.balanceTransactions
          .list({ payout: payoutId, limit: 100 })
          .autoPagingToArray({ limit: longestList }),
      ),
    listUndeliveredEvents: (since) =>
      askStripe(z.array(providerEvent), () =>
        stripe.events
          .list({ delivery_success: false, created: from(since), limit: 100 })
          .autoPagingToArray({ limit: longestList }),
      ),
    verifyEvent: (rawBody, signatureHeader, now) =>
      verifyEvent(settings.webhookSecret, rawBody, signatureHeader, now),
  }
}

function clientOf({ secretKey, apiBase, timeoutMilliseconds, retries }: StripeSettings): Stripe {
  return new Stripe(secretKey, {
    telemetry: false,
    timeout: timeoutMilliseconds ?? patience.timeoutMilliseconds,
    maxNetworkRetries: retries ?? patience.retries,
    ...(apiBase && {
      protocol: apiBase.protocol === 'https:' ? 'https' : 'http',
      host: apiBase.hostname,
      port: apiBase.port || (apiBase.protocol === 'https:' ? 443 : 80),
    }),
  })
}

function sessionParameters(order: CheckoutOrder): Stripe.Checkout.SessionCreateParams {
  const metadata = { order_id: order.orderId, company_id: order.companyId }
  return {
    mode: 'payment',
    client_reference_id: order.orderId,
    customer_email: order.customerEmail,
    line_items: [
      {
        quantity: 1,
        price_data: {
          currency: order.currency.toLowerCase(),
          unit_amount: order.unitAmountCents,
          product_data: { name: order.blockTitle },
        },
      },
    ],
    metadata,
    payment_intent_data: { metadata },
    success_url: order.successUrl,
    cancel_url: order.cancelUrl,
  }
}

const from = (since: number) => ({ gte: Math.floor(since / 1000) })

const notSettled = {
  code: 'not_settled',
  message: 'The payment has not settled yet, so its fee is not known. Ask again later.',
} as const
