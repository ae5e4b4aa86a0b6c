import { createStripePayments } from '@/lib/adapters/stripe/stripe-payments'
import type { Actor } from '@/lib/authz/actor'
import { startCheckout } from '@/lib/domain/billing/checkout.service'
import { receiveEvent } from '@/lib/domain/billing/event.service'
import type { Deps } from '@/lib/domain/deps'

import { startStripeFake, type SignedDelivery, type StripeFake } from '../fakes/stripe/stripe-fake'
import type { WireSession } from '../fakes/stripe/wire'
import { addCompany, addPerson } from './people'
import { testWebhookSecret, type TestPortal } from './test-portal'
import { valueOf } from './value-of'

export type PurchaseScene = {
  readonly fake: StripeFake
  /** The portal with its payments pointed at the fake, through the real SDK. */
  readonly deps: Deps
  readonly companyId: string
  readonly offerId: string
  readonly purchaser: Actor
  readonly administrator: Actor
}

export type Begun = { readonly purchaseId: string; readonly sessionId: string }

export const price = { netCents: 185_000, taxCents: 35_150, grossCents: 220_150 } as const

/** A catalogue of one block, a company with its purchaser, and a provider whose events the test delivers itself. */
export async function openPurchaseScene(portal: TestPortal): Promise<PurchaseScene> {
  const fake = await startStripeFake({ port: 0, webhookSecret: testWebhookSecret, now: portal.clock.now })
  const payments = createStripePayments({
    secretKey: 'sk_test_of_the_test',
    webhookSecret: testWebhookSecret,
    apiBase: new URL(fake.url),
    timeoutMilliseconds: 400,
    retries: 0,
  })
  const companyId = await addCompany(portal, 'Osterby Pump Controls')
  const memberships = [{ companyId, role: 'purchaser' as const }]
  return {
    fake,
    deps: { ...portal.deps, payments },
    companyId,
    offerId: await addOffer(portal),
    purchaser: await addPerson(portal, { name: 'Petra Lindqvist', memberships }),
    administrator: await addPerson(portal, { name: 'Maren Holt', isAdministrator: true }),
  }
}

/** Puts ten hours for a year on sale. */
export async function addOffer(portal: TestPortal): Promise<string> {
  const id = portal.deps.ids.newId()
  await portal.db
    .insertInto('block_offer')
    .values({
      id,
      title: 'Ten hours',
      minutes: 600,
      net_cents: price.netCents,
      currency: 'EUR',
      validity_months: 12,
      tax_basis_points: 1_900,
      tax_label: 'VAT 19 %',
      created_at: portal.clock.now(),
      archived_at: null,
    })
    .execute()
  return id
}

export const begin = ({ deps, purchaser, companyId, offerId }: PurchaseScene) =>
  startCheckout.execute(deps, purchaser, { companyId, offerId })

/** A purchase whose payment page is open. */
export async function beginPurchase(scene: PurchaseScene): Promise<Begun> {
  const { purchaseId } = valueOf(await begin(scene))
  const session = scene.fake.sessions().find((one) => one.client_reference_id === purchaseId)
  if (!session) throw new Error('The fake has no such session')
  return { purchaseId, sessionId: session.id }
}

export const deliver = (
  { deps }: Pick<PurchaseScene, 'deps'>,
  { body, signature }: Pick<SignedDelivery, 'body' | 'signature'>,
) => receiveEvent.execute(deps, { rawBody: body, signature })

/** Delivers an event of the fake by its id. */
export const deliverEvent = (scene: PurchaseScene, eventId: string) =>
  deliver(scene, scene.fake.signedEvent(eventId))

/** A purchase that was paid by card and told by the provider. */
export async function payPurchase(scene: PurchaseScene): Promise<Begun & { readonly eventId: string }> {
  const begun = await beginPurchase(scene)
  const eventId = await scene.fake.payNow(begun.sessionId)
  valueOf(await deliverEvent(scene, eventId))
  return { ...begun, eventId }
}

/** The fake's session as it is now. */
export function sessionOf({ fake }: PurchaseScene, sessionId: string): WireSession {
  const session = fake.store.sessions.get(sessionId)
  if (!session) throw new Error(`No session ${sessionId}`)
  return structuredClone(session)
}

/** What an event can change, straight from the tables. */
export async function booked(portal: TestPortal) {
  const { db } = portal
  const [purchases, payments, blocks, ledger, mails, events, effects] = await Promise.all([
    db
      .selectFrom('purchase')
      .select(['id', 'status', 'session_id', 'receipt_number', 'paid_at'])
      .orderBy('created_at')
      .execute(),
    db.selectFrom('payment').select(['purchase_id', 'gross_cents', 'fee_cents', 'net_cents']).execute(),
    db.selectFrom('hour_block').select(['company_id', 'minutes', 'valid_from', 'valid_until']).execute(),
    db.selectFrom('hour_ledger_entry').select(['kind', 'minutes', 'source_id']).execute(),
    db.selectFrom('outbox_message').select(['kind', 'recipient', 'payload']).execute(),
    db.selectFrom('provider_event').select(['id', 'type', 'outcome', 'note']).execute(),
    db.selectFrom('provider_effect').select(['object_id', 'effect']).execute(),
  ])
  return { purchases, payments, blocks, ledger, mails, events, effects }
}

/** What must not depend on which events came, how often and in which order: all but the record of the events. */
export async function endState(portal: TestPortal) {
  const { purchases, payments, blocks, ledger, mails } = await booked(portal)
  return { purchases, payments, blocks, ledger, mails }
}
