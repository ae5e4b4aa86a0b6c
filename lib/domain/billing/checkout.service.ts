import 'server-only'

import type { Tx } from '@/db/client'
import { findOffer, listOffers } from '@/db/repositories/offer.repo'
import {
  findPurchaseWithoutSession,
  insertPurchase,
  movePurchase,
  setSession,
  type PurchaseRow,
} from '@/db/repositories/purchase.repo'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { authorize, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { operation } from '../operation'
import { noSuchOffer, paymentsRefused, paymentsUnavailable, type BillingError } from './billing.errors'
import { companyIdSchema, startCheckoutSchema } from './billing.schema'
import { offerOf, type OfferDto } from './offer-dto'

/** The blocks of hours that a company can buy. */
export const offersFor = operation('billing.offers', companyIdSchema, async (deps, actor, input) => {
  const allowed = authorize(actor, 'offer.list', { kind: 'company', companyId: input.companyId })
  if (!allowed.ok) return allowed
  return ok((await listOffers(deps.db)).map(offerOf))
})

export type StartedCheckout = { readonly purchaseId: string; readonly url: string }

/**
 * Begins a purchase by card. Price, quantity and currency come from the catalogue and from nowhere else. The purchase
 * is stored first and its id is the provider's idempotency key; while no checkout is known for it, the next attempt
 * takes up the same purchase under the same key, so that an answer that got lost does not charge twice.
 * Errors: `no_such_offer`, `payments_unavailable` (try again), `payments_refused`.
 */
export const startCheckout = operation(
  'billing.startCheckout',
  startCheckoutSchema,
  async (deps, actor, input): Promise<Result<StartedCheckout, BillingError | Denial>> => {
    const allowed = authorize(actor, 'purchase.start', { kind: 'company', companyId: input.companyId })
    if (!allowed.ok) return allowed
    const purchase = await withTx(deps.db, async (tx) => {
      const row = await findOffer(tx, input.offerId)
      return row ? takeUpPurchase(tx, deps, actor, input.companyId, offerOf(row)) : undefined
    })
    return purchase ? openCheckout(deps, actor, purchase) : err(noSuchOffer)
  },
)

/** The person's purchase of this offer that has no checkout yet and still has today's terms, else a new one. */
async function takeUpPurchase(
  tx: Tx,
  deps: Deps,
  actor: Actor,
  companyId: string,
  offer: OfferDto,
): Promise<PurchaseRow> {
  const whose = { companyId, personId: actor.personId, offerId: offer.offerId }
  const begun = await findPurchaseWithoutSession(tx, whose)
  if (begun && hasTermsOf(begun, offer)) return begun
  const purchase: PurchaseRow = {
    id: deps.ids.newId(),
    company_id: companyId,
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
  }
  await insertPurchase(tx, purchase)
  return purchase
}

const hasTermsOf = (purchase: PurchaseRow, offer: OfferDto): boolean =>
  purchase.title === offer.title &&
  purchase.minutes === offer.minutes &&
  purchase.validity_months === offer.validityMonths &&
  purchase.net_cents === offer.netCents &&
  purchase.tax_cents === offer.taxCents &&
  purchase.currency === offer.currency

async function openCheckout(
  deps: Deps,
  actor: Actor,
  purchase: PurchaseRow,
): Promise<Result<StartedCheckout, BillingError>> {
  const { publicUrl } = deps.settings
  const checkout = await deps.payments.createCheckout({
    orderId: purchase.id,
    companyId: purchase.company_id,
    customerEmail: actor.email,
    blockTitle: purchase.title,
    unitAmountCents: purchase.gross_cents,
    currency: purchase.currency,
    successUrl: `${publicUrl}/purchases/${purchase.id}`,
    cancelUrl: `${publicUrl}/companies/${purchase.company_id}/hours/buy`,
    idempotencyKey: purchase.id,
  })
  if (checkout.ok) {
    await withTx(deps.db, (tx) => setSession(tx, purchase.id, checkout.value.sessionId))
    return ok({ purchaseId: purchase.id, url: checkout.value.url })
  }
  if (checkout.error.code !== 'refused') return err(paymentsUnavailable)
  // The provider answers the same key with the same refusal, so the next attempt needs a purchase of its own.
  await withTx(deps.db, (tx) => movePurchase(tx, purchase.id, ['open'], { status: 'failed' }))
  return err(paymentsRefused)
}
