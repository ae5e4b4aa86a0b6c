import { need, stamp, type Account } from './account'
import { book, feeOf } from './balance'
import type { WireCharge, WireIntent, WireSession } from './wire'

/** A card is accepted: the money is there at once. */
export function payNow(account: Account, sessionId: string): Promise<string> {
  const session = completeSession(account, sessionId)
  const intent = openIntent(account, session)
  session.payment_status = 'paid'
  const charge = succeed(account, intent)
  void account.publish('charge.succeeded', charge)
  return account.publish('checkout.session.completed', session)
}

/** A bank debit is set up: the checkout is complete, the money is not there yet. */
export function payLater(account: Account, sessionId: string): Promise<string> {
  const session = completeSession(account, sessionId)
  openIntent(account, session)
  return account.publish('checkout.session.completed', session)
}

/** The bank's answer to a debit that was set up. */
export function settleLater(
  account: Account,
  sessionId: string,
  outcome: 'succeeded' | 'failed',
): Promise<string> {
  const session = need(account.store.sessions, sessionId)
  const intent = need(account.store.intents, session.payment_intent ?? 'payment of this session')
  if (intent.status !== 'processing') throw new Error(`The payment of ${sessionId} is already decided`)
  if (outcome === 'failed') {
    intent.status = 'requires_payment_method'
    return account.publish('checkout.session.async_payment_failed', session)
  }
  session.payment_status = 'paid'
  succeed(account, intent)
  return account.publish('checkout.session.async_payment_succeeded', session)
}

export function expireSession(account: Account, sessionId: string): Promise<string> {
  const session = openSession(account, sessionId)
  session.status = 'expired'
  session.url = null
  return account.publish('checkout.session.expired', session)
}

function openSession(account: Account, sessionId: string): WireSession {
  const session = need(account.store.sessions, sessionId)
  if (session.status !== 'open') throw new Error(`${sessionId} is not open but ${session.status}`)
  return session
}

function completeSession(account: Account, sessionId: string): WireSession {
  const session = openSession(account, sessionId)
  session.status = 'complete'
  session.url = null
  return session
}

function openIntent(account: Account, session: WireSession): WireIntent {
  const intent: WireIntent = {
    ...stamp(account),
    id: account.newId('pi'),
    object: 'payment_intent',
    amount: session.amount_total,
    currency: session.currency,
    metadata: session.metadata,
    status: 'processing',
    latest_charge: null,
  }
  account.store.intents.set(intent.id, intent)
  session.payment_intent = intent.id
  return intent
}

function succeed(account: Account, intent: WireIntent): WireCharge {
  const id = account.newId('ch')
  const { amount, currency } = intent
  const entry = book(account, { type: 'charge', amount, fee: feeOf(amount), currency, source: id })
  const charge: WireCharge = {
    ...stamp(account),
    id,
    object: 'charge',
    amount,
    currency,
    payment_intent: intent.id,
    status: 'succeeded',
    balance_transaction: entry.id,
    amount_refunded: 0,
    refunded: false,
    disputed: false,
  }
  account.store.charges.set(id, charge)
  intent.latest_charge = id
  intent.status = 'succeeded'
  return charge
}
