import { need, stamp, type Account } from './account'
import { book } from './balance'
import type { WireCharge, WireDispute, WirePayout, WireRefund } from './wire'

export const chargeOf = (account: Account, paymentIntentId: string): WireCharge =>
  need(account.store.charges, need(account.store.intents, paymentIntentId).latest_charge ?? 'charge')

/** Returns part or all of a payment; the fee is not given back (the fake's own rule). */
export function refundPayment(
  account: Account,
  paymentIntentId: string,
  amount: number,
): { readonly refund: WireRefund; readonly published: Promise<string> } {
  const charge = chargeOf(account, paymentIntentId)
  const id = account.newId('re')
  const { currency } = charge
  const entry = book(account, { type: 'refund', amount: -amount, fee: 0, currency, source: id })
  const refund: WireRefund = {
    ...stamp(account),
    id,
    object: 'refund',
    amount,
    currency,
    charge: charge.id,
    payment_intent: paymentIntentId,
    balance_transaction: entry.id,
    status: 'succeeded',
  }
  account.store.refunds.set(id, refund)
  charge.amount_refunded += amount
  charge.refunded = charge.amount_refunded === charge.amount
  return { refund, published: account.publish('charge.refunded', charge) }
}

export function openDispute(account: Account, paymentIntentId: string): Promise<string> {
  const charge = chargeOf(account, paymentIntentId)
  const dispute: WireDispute = {
    ...stamp(account),
    id: account.newId('du'),
    object: 'dispute',
    amount: charge.amount,
    currency: charge.currency,
    charge: charge.id,
    payment_intent: paymentIntentId,
    reason: 'general',
    status: 'needs_response',
  }
  account.store.disputes.set(dispute.id, dispute)
  charge.disputed = true
  return account.publish('charge.dispute.created', dispute)
}

/** A dispute that is lost takes the money back. */
export function closeDispute(account: Account, disputeId: string, outcome: 'won' | 'lost'): Promise<string> {
  const dispute = need(account.store.disputes, disputeId)
  dispute.status = outcome
  if (outcome === 'lost') {
    const { amount, currency, id } = dispute
    book(account, { type: 'adjustment', amount: -amount, fee: 0, currency, source: id })
  }
  return account.publish('charge.dispute.closed', dispute)
}

/** Sends everything that no payout took along yet to the bank, in one payout for each currency. */
export async function payOut(account: Account): Promise<readonly WirePayout[]> {
  const { balance, paidOutBy, payouts } = account.store
  const waiting = [...balance.values()].filter((entry) => entry.type !== 'payout' && !paidOutBy.has(entry.id))
  const made: WirePayout[] = []
  for (const currency of new Set(waiting.map((entry) => entry.currency))) {
    const entries = waiting.filter((entry) => entry.currency === currency)
    const amount = entries.reduce((sum, entry) => sum + entry.net, 0)
    if (amount <= 0) continue
    const times = stamp(account)
    const id = account.newId('po')
    const payout: WirePayout = {
      ...times,
      id,
      object: 'payout',
      amount,
      currency,
      status: 'paid',
      arrival_date: times.created,
    }
    payouts.set(id, payout)
    const debit = book(account, { type: 'payout', amount: -amount, fee: 0, currency, source: id })
    for (const entry of [...entries, debit]) paidOutBy.set(entry.id, id)
    await account.publish('payout.paid', payout)
    made.push(payout)
  }
  return made
}
