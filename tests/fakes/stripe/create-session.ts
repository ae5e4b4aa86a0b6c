import { z } from 'zod'

import { stamp, type Account } from './account'
import type { WireSession } from './wire'

const whole = z.string().regex(/^\d+$/).transform(Number)
const metadata = z.record(z.string(), z.string()).default({})

export const sessionInput = z.strictObject({
  mode: z.literal('payment'),
  client_reference_id: z.string().max(200).optional(),
  customer_email: z.email().optional(),
  line_items: z.strictObject({
    0: z.strictObject({
      quantity: whole,
      price_data: z.strictObject({
        currency: z.string().regex(/^[a-z]{3}$/),
        unit_amount: whole,
        product_data: z.strictObject({ name: z.string().min(1) }),
      }),
    }),
  }),
  metadata,
  payment_intent_data: z.strictObject({ metadata }).optional(),
  success_url: z.url(),
  cancel_url: z.url().optional(),
})

const lifetimeSeconds = 24 * 3600

export function createSession(
  account: Account,
  pagesUrl: string,
  input: z.infer<typeof sessionInput>,
): WireSession {
  const { quantity, price_data: price } = input.line_items[0]
  const id = account.newId('cs_test')
  const times = stamp(account)
  const session: WireSession = {
    ...times,
    id,
    object: 'checkout.session',
    mode: 'payment',
    client_reference_id: input.client_reference_id ?? null,
    customer: null,
    customer_email: input.customer_email ?? null,
    metadata: input.metadata,
    success_url: input.success_url,
    cancel_url: input.cancel_url ?? null,
    expires_at: times.created + lifetimeSeconds,
    url: `${pagesUrl}/pay/${id}`,
    status: 'open',
    payment_status: 'unpaid',
    amount_subtotal: price.unit_amount * quantity,
    amount_total: price.unit_amount * quantity,
    currency: price.currency,
    payment_intent: null,
  }
  account.store.sessions.set(id, session)
  account.store.titles.set(id, price.product_data.name)
  return session
}
