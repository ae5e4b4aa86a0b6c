import 'server-only'

import { hasProviderEvent, insertProviderEvent } from '@/db/repositories/provider-event.repo'
import { withTx } from '@/db/tx'
import { err, ok, type Result } from '@/lib/core/result'

import { openOperation } from '../operation'
import { applyEvent, type Applied } from './apply-event'
import { notAccepted, type BillingError } from './billing.errors'
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
    return ok(
      await withTx(deps.db, async (tx): Promise<Applied> => {
        if (await hasProviderEvent(tx, event.id)) {
          return { outcome: 'already_applied', note: 'Delivered before' }
        }
        const applied = await applyEvent(tx, deps, event)
        await insertProviderEvent(tx, {
          id: event.id,
          type: event.type,
          object_id: event.objectId,
          created_at: event.createdAt,
          received_at: now,
          ...applied,
        })
        return applied
      }),
    )
  },
)
