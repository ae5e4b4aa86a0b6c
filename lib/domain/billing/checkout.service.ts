import 'server-only'

import { findOffer, listOffers } from '@/db/repositories/offer.repo'
import { findPurchase, insertPurchase, setSession } from '@/db/repositories/purchase.repo'
import { withTx } from '@/db/tx'
import { authorize, notFound } from '@/lib/authz/authorize'
import { err, ok } from '@/lib/core/result'

import { operation } from '../operation'
import { noSuchOffer, paymentsUnavailable } from './billing.errors'
import { companyIdSchema, purchaseIdSchema, startCheckoutSchema } from './billing.schema'
import { offerOf } from './offer-dto'

/** The blocks of hours that a company can buy. */
export const offersFor = operation('billing.offers', companyIdSchema, async (deps, actor, input) => {
  const allowed = authorize(actor, 'offer.list', { kind: 'company', companyId: input.companyId })
  if (!allowed.ok) return allowed
  return ok((await listOffers(deps.db)).map(offerOf))
})

/**
 * Begins a purchase by card. Price, quantity and currency come from the catalogue and from nowhere else. The purchase
 * is stored first; its id is the provider's idempotency key, so that an answer that got lost does not charge twice.
 */
export const startCheckout = operation(
  'billing.startCheckout',
  startCheckoutSchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'purchase.start', { kind: 'company', companyId: input.companyId })
    if (!allowed.ok) return allowed
    const row = await findOffer(deps.db, input.offerId)
    if (!row) return err(noSuchOffer)
    const offer = offerOf(row)
    const purchaseId = deps.ids.newId()
    await withTx(deps.db, (tx) =>
      insertPurchase(tx, {
        id: purchaseId,
        company_id: input.companyId,
        person_id: actor.personId,
        offer_id: offer.offerId,
        title: offer.title,
        minutes: offer.minutes,
        validity_months: offer.validityMonths,
        net_cents: offer.netCents,
        tax_cents: offer.taxCents,
        gross_cents: offer.grossCents,
        tax_label: offer.taxLabel,
        currency: offer.currency,
        status: 'open',
        session_id: null,
        receipt_number: null,
        created_at: deps.clock.now(),
        paid_at: null,
      }),
    )
    const { publicUrl } = deps.settings
    const checkout = await deps.payments.createCheckout({
      orderId: purchaseId,
      companyId: input.companyId,
      customerEmail: actor.email,
      blockTitle: offer.title,
      unitAmountCents: offer.grossCents,
      currency: offer.currency,
      successUrl: `${publicUrl}/purchases/${purchaseId}`,
      cancelUrl: `${publicUrl}/companies/${input.companyId}/hours/buy`,
      idempotencyKey: `checkout-${purchaseId}`,
    })
    if (!checkout.ok) return err(paymentsUnavailable)
    await setSession(deps.db, purchaseId, checkout.value.sessionId)
    return ok({ purchaseId, url: checkout.value.url })
  },
)

/** How a purchase stands. Looking at it changes nothing: hours are credited by the provider's event alone. */
export const purchaseStatus = operation(
  'billing.purchaseStatus',
  purchaseIdSchema,
  async (deps, actor, input) => {
    const row = await findPurchase(deps.db, input.purchaseId)
    if (!row) return err(notFound)
    const allowed = authorize(actor, 'purchase.read', { kind: 'company', companyId: row.company_id })
    if (!allowed.ok) return err(notFound)
    return ok({
      purchaseId: row.id,
      companyId: row.company_id,
      title: row.title,
      minutes: row.minutes,
      grossCents: row.gross_cents,
      currency: row.currency,
      status: row.status,
      receiptNumber: row.receipt_number,
    })
  },
)
