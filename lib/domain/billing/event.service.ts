import 'server-only'

import { listUnsettledPayments, settlePayment } from '@/db/repositories/payment.repo'
import { hasProviderEvent, insertProviderEvent } from '@/db/repositories/provider-event.repo'
import { withTx } from '@/db/tx'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { openOperation } from '../operation'
import { applyEvent, type Applied } from './apply-event'
import type { BillingError } from './billing.errors'
import { deliverySchema } from './billing.schema'

/**
 * Takes one delivery of the payment provider: its signature over the raw body first, then, in one transaction, the
 * record of the event and its effect. A second delivery of the same event has none.
 */
export const receiveEvent = openOperation(
  'billing.receiveEvent',
  deliverySchema,
  async (deps, { rawBody, signature }): Promise<Result<Applied, BillingError>> => {
    const now = deps.clock.now()
    const verified = deps.payments.verifyEvent(rawBody, signature, now)
    if (!verified.ok) return err(notAccepted(verified.error))
    const event = verified.value
    const applied = await withTx(deps.db, async (tx): Promise<Applied> => {
      if (await hasProviderEvent(tx, event.id))
        return { outcome: 'already_applied', note: 'Delivered before' }
      const result = await applyEvent(tx, deps, event)
      await insertProviderEvent(tx, {
        id: event.id,
        type: event.type,
        object_id: event.objectId,
        created_at: event.createdAt,
        received_at: now,
        outcome: result.outcome,
        note: result.note,
      })
      return result
    })
    return ok(applied)
  },
)

/**
 * Asks the provider for the fee of every payment that has none yet. Called after an event and before the books are
 * shown; a provider that does not answer is asked again the next time.
 */
export async function settlePayments(deps: Pick<Deps, 'db' | 'payments'>): Promise<void> {
  for (const payment of await listUnsettledPayments(deps.db)) {
    const settled = await deps.payments.getBalanceTransaction(payment.payment_intent_id)
    if (!settled.ok || settled.value.grossCents !== payment.gross_cents) continue
    await settlePayment(deps.db, payment.id, {
      balanceTransactionId: settled.value.id,
      feeCents: settled.value.feeCents,
      netCents: settled.value.netCents,
    })
  }
}

const notAccepted = (reason: string): BillingError => ({
  code: 'invalid_signature',
  message: `The delivery was not accepted: ${reason.replaceAll('_', ' ')}.`,
})
