import 'server-only'

import type { Tx } from '@/db/client'
import { findCompany } from '@/db/repositories/company.repo'
import { insertPayment } from '@/db/repositories/payment.repo'
import { findPerson } from '@/db/repositories/person.repo'
import { claimEffect } from '@/db/repositories/provider-event.repo'
import {
  findPurchase,
  movePurchase,
  nextReceiptNumber,
  type PurchaseRow,
} from '@/db/repositories/purchase.repo'
import type { ProviderEventOutcome } from '@/db/tables/billing'
import type { Checkout, ProviderEvent } from '@/lib/ports/payments'

import type { Deps } from '../deps'
import { creditBlock } from '../hours/credit-block'
import { openBlocks, spendableMinutes } from '../hours/open-blocks'
import { queueMail } from '../mail'
import { afterMonths } from './calendar-months'

export type Applied = { readonly outcome: ProviderEventOutcome; readonly note: string }

const ignored: Applied = { outcome: 'ignored', note: 'Nothing to do for an event of this type' }

/**
 * Has the effect of one verified event, within the transaction that records it. State only moves forward, and an
 * effect on an object happens once, whichever event brings it and in whichever order they come.
 */
export async function applyEvent(tx: Tx, deps: Deps, event: ProviderEvent): Promise<Applied> {
  const { object } = event
  switch (object.kind) {
    case 'checkout_completed':
      return object.checkout.paymentStatus === 'paid'
        ? pay(tx, deps, event, object.checkout)
        : { outcome: 'ignored', note: 'The payment is still under way' }
    case 'checkout_paid_later':
      return pay(tx, deps, event, object.checkout)
    case 'checkout_failed_later':
      return giveUp(tx, event, object.checkout, 'failed')
    case 'checkout_expired':
      return giveUp(tx, event, object.checkout, 'expired')
    case 'charge_refunded':
    case 'dispute_opened':
    case 'dispute_closed':
    case 'payout_paid':
    case 'unknown':
      return ignored
  }
}

async function pay(tx: Tx, deps: Deps, event: ProviderEvent, checkout: Checkout): Promise<Applied> {
  const purchase = checkout.orderId ? await findPurchase(tx, checkout.orderId) : undefined
  if (!purchase) return refused('No purchase of ours has this reference')
  const difference = differenceOf(purchase, checkout)
  if (difference) return refused(difference)
  const effect = { objectId: checkout.sessionId, effect: 'credit', eventId: event.id }
  if (!(await claimEffect(tx, effect))) return { outcome: 'already_applied', note: 'Credited before' }
  const now = deps.clock.now()
  const receiptNumber = await nextReceiptNumber(tx)
  const isMoved = await movePurchase(tx, purchase.id, ['open', 'failed', 'expired'], {
    status: 'paid',
    receipt_number: receiptNumber,
    paid_at: now,
  })
  if (!isMoved) return { outcome: 'already_applied', note: `The purchase is ${purchase.status} already` }
  await insertPayment(tx, {
    id: deps.ids.newId(),
    purchase_id: purchase.id,
    payment_intent_id: checkout.paymentIntentId ?? checkout.sessionId,
    gross_cents: purchase.gross_cents,
    currency: purchase.currency,
    balance_transaction_id: null,
    fee_cents: null,
    net_cents: null,
    created_at: now,
  })
  const validUntil = afterMonths(now, purchase.validity_months)
  await creditBlock(tx, deps, {
    companyId: purchase.company_id,
    title: purchase.title,
    minutes: purchase.minutes,
    validFrom: now,
    validUntil,
    source: { kind: 'purchase', id: purchase.id },
  })
  await mailReceipt(tx, deps, purchase, { receiptNumber, validUntil, now })
  return { outcome: 'applied', note: `Credited ${purchase.minutes} minutes` }
}

/** What the provider says was paid must be what we asked for, to the cent. */
function differenceOf(purchase: PurchaseRow, checkout: Checkout): string | null {
  if (purchase.session_id !== null && purchase.session_id !== checkout.sessionId) return 'Another checkout'
  if (checkout.amountTotalCents !== purchase.gross_cents) return 'The amount differs from our price'
  if (checkout.currency?.toUpperCase() !== purchase.currency) return 'The currency differs from ours'
  if (checkout.metadata['company_id'] !== purchase.company_id) return 'The company differs'
  return null
}

const refused = (note: string): Applied => ({ outcome: 'refused', note })

async function giveUp(
  tx: Tx,
  event: ProviderEvent,
  checkout: Checkout,
  status: 'failed' | 'expired',
): Promise<Applied> {
  const purchase = checkout.orderId ? await findPurchase(tx, checkout.orderId) : undefined
  if (!purchase) return refused('No purchase of ours has this reference')
  await claimEffect(tx, { objectId: checkout.sessionId, effect: status, eventId: event.id })
  const isMoved = await movePurchase(tx, purchase.id, ['open'], { status })
  return isMoved
    ? { outcome: 'applied', note: `The purchase is ${status}` }
    : { outcome: 'already_applied', note: `The purchase is ${purchase.status} already` }
}

type Receipt = { readonly receiptNumber: number; readonly validUntil: number; readonly now: number }

async function mailReceipt(tx: Tx, deps: Deps, purchase: PurchaseRow, receipt: Receipt): Promise<void> {
  const person = await findPerson(tx, purchase.person_id)
  const company = await findCompany(tx, purchase.company_id)
  if (!person || !company) throw new Error('A purchase without its buyer')
  const blocks = await openBlocks(tx, purchase.company_id)
  await queueMail(tx, deps, {
    to: person.email,
    dedupeKey: `receipt:${purchase.id}`,
    mail: {
      kind: 'receipt',
      receiptNumber: receipt.receiptNumber,
      companyName: company.name,
      title: purchase.title,
      minutes: purchase.minutes,
      netCents: purchase.net_cents,
      taxCents: purchase.tax_cents,
      taxLabel: purchase.tax_label,
      grossCents: purchase.gross_cents,
      currency: purchase.currency,
      paidAt: receipt.now,
      balanceMinutes: spendableMinutes(blocks, receipt.now),
      validUntil: receipt.validUntil,
    },
  })
}
