import 'server-only'

import type { Tx } from '@/db/client'
import { findCompany } from '@/db/repositories/company.repo'
import { insertPayment } from '@/db/repositories/payment.repo'
import { findPerson } from '@/db/repositories/person.repo'
import { movePurchase, nextReceiptNumber, type PurchaseRow } from '@/db/repositories/purchase.repo'

import type { Deps } from '../deps'
import { creditBlock } from '../hours/credit-block'
import { openBlocks, spendableMinutes } from '../hours/open-blocks'
import { queueMail } from '../mail'
import { afterMonths } from './calendar-months'

type PaidCheckout = { readonly sessionId: string; readonly paymentIntentId: string }

/**
 * Money arrived for a purchase: it gets the next receipt number, a payment, a block with its credit, and the buyer a
 * receipt by mail. All within the caller's transaction.
 * @returns false when the purchase was paid before; then nothing is written.
 */
export async function creditPurchase(
  tx: Tx,
  deps: Deps,
  purchase: PurchaseRow,
  checkout: PaidCheckout,
): Promise<boolean> {
  const now = deps.clock.now()
  const receiptNumber = await nextReceiptNumber(tx)
  // Money outranks everything: a page that lapsed or a debit that failed first does not keep what was paid from its buyer.
  const isMoved = await movePurchase(tx, purchase.id, ['open', 'failed', 'expired'], {
    status: 'paid',
    session_id: checkout.sessionId,
    receipt_number: receiptNumber,
    paid_at: now,
  })
  if (!isMoved) return false
  await insertPayment(tx, {
    id: deps.ids.newId(),
    purchase_id: purchase.id,
    payment_intent_id: checkout.paymentIntentId,
    gross_cents: purchase.gross_cents,
    currency: purchase.currency,
    balance_transaction_id: null,
    settled_cents: null,
    settled_currency: null,
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
  return true
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
