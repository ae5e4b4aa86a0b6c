import 'server-only'

import { findBlockOf } from '@/db/repositories/hour-ledger.repo'
import { hasEffect } from '@/db/repositories/provider-event.repo'
import { findPurchase, listPurchasesOf, type PurchaseRow } from '@/db/repositories/purchase.repo'
import { authorize, notFound } from '@/lib/authz/authorize'
import { err, ok } from '@/lib/core/result'

import type { Deps } from '../deps'
import { operation } from '../operation'
import { companyIdSchema, purchaseIdSchema } from './billing.schema'
import { effects } from './effects'

/**
 * Where a purchase stands for its buyer. not_begun: the payment page was never reached. open: the payment page waits.
 * arriving: paid, but the bank has not confirmed the money yet.
 */
export type PurchaseStanding = 'not_begun' | 'open' | 'arriving' | 'paid' | 'failed' | 'expired' | 'refunded'

/** How a purchase stands. Looking at it changes nothing: hours are credited by the provider's event alone. */
export const purchaseStatus = operation(
  'billing.purchaseStatus',
  purchaseIdSchema,
  async (deps, actor, input) => {
    const row = await findPurchase(deps.db, input.purchaseId)
    if (!row) return err(notFound)
    const allowed = authorize(actor, 'purchase.read', { kind: 'company', companyId: row.company_id })
    // A purchase is no secret of its own: who may not read it learns nothing of it.
    if (!allowed.ok) return err(notFound)
    const block = await findBlockOf(deps.db, { kind: 'purchase', id: row.id })
    return ok({
      ...purchaseOf(row),
      companyId: row.company_id,
      offerId: row.offer_id,
      standing: await standingOf(deps, row),
      netCents: row.net_cents,
      taxCents: row.tax_cents,
      taxLabel: row.tax_label,
      validUntil: block?.valid_until ?? null,
    })
  },
)

/** What a company bought, newest first; attempts that came to nothing are left out. */
export const companyPurchases = operation(
  'billing.companyPurchases',
  companyIdSchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'purchase.read', { kind: 'company', companyId: input.companyId })
    if (!allowed.ok) return allowed
    const rows = await listPurchasesOf(deps.db, input.companyId)
    return ok(rows.filter((row) => row.receipt_number !== null).map(purchaseOf))
  },
)

const purchaseOf = (row: PurchaseRow) => ({
  purchaseId: row.id,
  title: row.title,
  minutes: row.minutes,
  grossCents: row.gross_cents,
  currency: row.currency,
  status: row.status,
  receiptNumber: row.receipt_number,
  paidAt: row.paid_at,
})

async function standingOf(deps: Deps, row: PurchaseRow): Promise<PurchaseStanding> {
  if (row.status !== 'open') return row.status
  if (row.session_id === null) return 'not_begun'
  return (await hasEffect(deps.db, row.session_id, effects.completed)) ? 'arriving' : 'open'
}
