import 'server-only'

import type { Tx } from '@/db/client'
import { claimEffect } from '@/db/repositories/provider-event.repo'
import { findPurchase, movePurchase, type PurchaseRow } from '@/db/repositories/purchase.repo'
import type { ProviderEventOutcome, PurchaseStatus } from '@/db/tables/billing'
import { cents } from '@/lib/core/money/cents'
import { moneyText } from '@/lib/core/money/format-money'
import { err, ok, type Result } from '@/lib/core/result'
import type { Checkout, ProviderEvent } from '@/lib/ports/payments'

import type { Deps } from '../deps'
import { creditPurchase } from './credit-purchase'
import { effects } from './effects'

export type Applied = { readonly outcome: ProviderEventOutcome; readonly note: string }

/**
 * Has the effect of one verified event, within the transaction that records it. State only moves forward, and an
 * effect on an object happens once, whichever event brings it and in whichever order they come.
 */
export async function applyEvent(tx: Tx, deps: Deps, event: ProviderEvent): Promise<Applied> {
  const { object } = event
  switch (object.kind) {
    case 'checkout_completed':
      return object.checkout.paymentStatus === 'unpaid'
        ? awaitMoney(tx, event, object.checkout)
        : pay(tx, deps, event, object.checkout)
    case 'checkout_paid_later':
      return pay(tx, deps, event, object.checkout)
    case 'checkout_failed_later':
      return giveUp(tx, event, object.checkout, 'failed')
    case 'checkout_expired':
      return giveUp(tx, event, object.checkout, 'expired')
    case 'charge_refunded':
    case 'dispute_opened':
    case 'dispute_closed':
      return ignored('Settled by hand: nothing was changed here')
    case 'payout_paid':
    case 'unknown':
      return ignored('Nothing to do for an event of this type')
  }
}

const ignored = (note: string): Applied => ({ outcome: 'ignored', note })
const refused = (note: string): Applied => ({ outcome: 'refused', note })
const appliedBefore = (note: string): Applied => ({ outcome: 'already_applied', note })

async function pay(tx: Tx, deps: Deps, event: ProviderEvent, checkout: Checkout): Promise<Applied> {
  const found = await purchaseOf(tx, checkout)
  if (!found.ok) return refused(found.error)
  const purchase = found.value
  if (checkout.paymentStatus !== 'paid') return refused('The provider does not say that it was paid')
  const { paymentIntentId } = checkout
  if (paymentIntentId === null) return refused('The provider names no payment')
  if (!(await claim(tx, event, checkout, effects.credit))) return appliedBefore('Credited before')
  const isCredited = await creditPurchase(tx, deps, purchase, {
    sessionId: checkout.sessionId,
    paymentIntentId,
  })
  return isCredited
    ? { outcome: 'applied', note: `Credited ${purchase.minutes} minutes` }
    : appliedBefore(`The purchase is ${purchase.status} already`)
}

/** The payment is set up, for instance as a bank debit; the money has not arrived. */
async function awaitMoney(tx: Tx, event: ProviderEvent, checkout: Checkout): Promise<Applied> {
  const found = await purchaseOf(tx, checkout)
  if (!found.ok) return refused(found.error)
  const isFirst = await claim(tx, event, checkout, effects.completed)
  return isFirst
    ? { outcome: 'applied', note: 'Waiting for the money' }
    : appliedBefore('Waiting for the money since an earlier event')
}

/** Which states may still become the final ones without money; a payment that failed outranks a lapsed page. */
const before: Record<'failed' | 'expired', readonly PurchaseStatus[]> = {
  failed: ['open', 'expired'],
  expired: ['open'],
}

async function giveUp(
  tx: Tx,
  event: ProviderEvent,
  checkout: Checkout,
  status: 'failed' | 'expired',
): Promise<Applied> {
  const found = await purchaseOf(tx, checkout)
  if (!found.ok) return refused(found.error)
  if (!(await claim(tx, event, checkout, effects[status]))) return appliedBefore('Told by an earlier event')
  const isMoved = await movePurchase(tx, found.value.id, before[status], { status })
  return isMoved
    ? { outcome: 'applied', note: `The purchase is ${status}` }
    : appliedBefore(`The purchase is ${found.value.status} already`)
}

const claim = (tx: Tx, event: ProviderEvent, checkout: Checkout, effect: string): Promise<boolean> =>
  claimEffect(tx, { objectId: checkout.sessionId, effect, eventId: event.id })

/** The purchase that a checkout belongs to, when all that the provider says of it is what we asked for. */
async function purchaseOf(tx: Tx, checkout: Checkout): Promise<Result<PurchaseRow, string>> {
  const purchase = checkout.orderId === null ? undefined : await findPurchase(tx, checkout.orderId)
  if (!purchase) return err(`No purchase of ours has the reference ${checkout.orderId ?? '(none)'}`)
  const difference = differenceOf(purchase, checkout)
  return difference === null ? ok(purchase) : err(difference)
}

function differenceOf(purchase: PurchaseRow, checkout: Checkout): string | null {
  const { amountTotalCents: amount, currency } = checkout
  if (purchase.session_id !== null && purchase.session_id !== checkout.sessionId) {
    return `Purchase ${purchase.id} has another checkout than ${checkout.sessionId}`
  }
  if (amount !== purchase.gross_cents || currency !== purchase.currency) {
    const told = amount === null ? 'no amount' : moneyText(cents(amount), currency ?? 'of no currency')
    return `The provider says ${told}, our price is ${moneyText(cents(purchase.gross_cents), purchase.currency)}`
  }
  if (checkout.metadata['company_id'] !== purchase.company_id) {
    return `The provider names another company for purchase ${purchase.id}`
  }
  return null
}
