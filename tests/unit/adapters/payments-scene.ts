import { afterEach } from 'vitest'

import { createStripePayments, type StripeSettings } from '@/lib/adapters/stripe/stripe-payments'
import type { CheckoutOrder, Payments } from '@/lib/ports/payments'

import { startStripeFake, type StripeFake, type StripeFakeOptions } from '../../fakes/stripe/stripe-fake'

export const webhookSecret = 'whsec_for_tests_only'

const open: StripeFake[] = []

afterEach(async () => {
  for (const fake of open.splice(0)) await fake.close()
})

/** The real SDK behind our port, pointed at a fake of its own; both end with the test. */
export async function paymentsScene(
  settings: Partial<StripeSettings> = {},
  options: Partial<StripeFakeOptions> = {},
): Promise<{ readonly fake: StripeFake; readonly payments: Payments }> {
  const fake = await startStripeFake({ port: 0, webhookSecret, ...options })
  open.push(fake)
  const payments = createStripePayments({
    secretKey: 'sk_test_for_tests',
    webhookSecret,
    apiBase: new URL(fake.url),
    ...settings,
  })
  return { fake, payments }
}

export const order: CheckoutOrder = {
  orderId: 'order-1',
  companyId: 'company-1',
  customerEmail: 'purchaser@osterby.example',
  blockTitle: 'Twenty hours & “more”',
  unitAmountCents: 360_000,
  currency: 'EUR',
  successUrl: 'http://localhost:3000/hours/thanks?session={CHECKOUT_SESSION_ID}',
  cancelUrl: 'http://localhost:3000/hours',
  idempotencyKey: 'order-1:checkout',
}

/** A checkout whose card was accepted. */
export async function paidCheckout({ fake, payments }: { fake: StripeFake; payments: Payments }) {
  const created = await payments.createCheckout(order)
  if (!created.ok) throw new Error(created.error.message)
  const eventId = await fake.payNow(created.value.sessionId)
  const checkout = await payments.getCheckout(created.value.sessionId)
  if (!checkout.ok || checkout.value.paymentIntentId === null) throw new Error('The checkout was not paid')
  return { eventId, sessionId: created.value.sessionId, paymentIntentId: checkout.value.paymentIntentId }
}
