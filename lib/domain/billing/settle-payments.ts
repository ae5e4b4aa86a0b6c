import 'server-only'

import { listUnsettledPayments, settlePayment } from '@/db/repositories/payment.repo'

import type { Deps } from '../deps'

export type Settled = { readonly settled: number; readonly waiting: number }

/**
 * Asks the provider for fee and net of every payment that has none yet; after an event, and again from time to time.
 * What the provider booked is stored as it says, also where it differs from what was paid: the books show it.
 */
export async function settlePayments(deps: Pick<Deps, 'db' | 'payments'>): Promise<Settled> {
  const unsettled = await listUnsettledPayments(deps.db)
  let settled = 0
  for (const payment of unsettled) {
    const booked = await deps.payments.getBalanceTransaction(payment.payment_intent_id)
    // One answer that does not come is enough: the others would be waited for in vain as well.
    if (!booked.ok && booked.error.code === 'not_reachable') break
    if (!booked.ok) continue
    await settlePayment(deps.db, payment.id, booked.value)
    settled += 1
  }
  return { settled, waiting: unsettled.length - settled }
}
