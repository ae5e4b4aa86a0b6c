import { z } from 'zod'

import type { ProviderEvent, ProviderObject } from '@/lib/ports/payments'

import { charge, checkout, dispute, payout } from './stripe-wire'

const checkoutEvent = <Kind extends string>(kind: Kind) =>
  checkout.transform((value) => ({ kind, checkout: value }))

const disputeEvent = <Kind extends string>(kind: Kind) =>
  dispute.transform((value) => ({ kind, dispute: value }))

/** The types that have an effect here, each with what its object must look like. */
const handled = new Map<string, z.ZodType<ProviderObject>>([
  ['checkout.session.completed', checkoutEvent('checkout_completed')],
  ['checkout.session.async_payment_succeeded', checkoutEvent('checkout_paid_later')],
  ['checkout.session.async_payment_failed', checkoutEvent('checkout_failed_later')],
  ['checkout.session.expired', checkoutEvent('checkout_expired')],
  ['charge.refunded', charge.transform((value) => ({ kind: 'charge_refunded', charge: value }))],
  ['charge.dispute.created', disputeEvent('dispute_opened')],
  ['charge.dispute.closed', disputeEvent('dispute_closed')],
  ['payout.paid', payout.transform((value) => ({ kind: 'payout_paid', payout: value }))],
])

const envelope = z.object({
  id: z.string().min(1),
  object: z.literal('event'),
  type: z.string().min(1),
  created: z.int(),
  data: z.object({ object: z.looseObject({ id: z.string().optional() }) }),
})

/** An event as the provider writes it, in our words; a type without effect here becomes `unknown`. */
export const providerEvent = envelope.transform((event, context): ProviderEvent => {
  const parsed = handled.get(event.type)?.safeParse(event.data.object)
  if (parsed?.success === false) {
    for (const { path, message } of parsed.error.issues)
      context.addIssue({ code: 'custom', message, path: ['data', 'object', ...path] })
    return z.NEVER
  }
  return {
    id: event.id,
    type: event.type,
    createdAt: event.created * 1000,
    objectId: event.data.object.id ?? null,
    object: parsed?.data ?? { kind: 'unknown' },
  }
})
