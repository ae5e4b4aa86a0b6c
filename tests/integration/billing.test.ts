import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { catalogue } from '@/lib/domain/billing/books.service'
import { afterMonths } from '@/lib/domain/billing/calendar-months'
import { offersFor, startCheckout } from '@/lib/domain/billing/checkout.service'
import { companyPurchases, purchaseStatus } from '@/lib/domain/billing/purchase.service'

import { addCompany, addPerson } from '../support/people'
import {
  begin,
  beginPurchase,
  booked,
  openPurchaseScene,
  payPurchase,
  price,
  sessionOf,
  type PurchaseScene,
} from '../support/purchase-scene'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

let portal: TestPortal
let scene: PurchaseScene

beforeEach(async () => {
  portal = await openTestPortal()
  scene = await openPurchaseScene(portal)
})

afterEach(async () => {
  await scene.fake.close()
  await portal.close()
})

const creations = () => scene.fake.requests().filter((line) => line === 'POST /v1/checkout/sessions')

describe('the offers', () => {
  it('show hours, net, tax, the whole price and how long the block is valid', async () => {
    const { companyId, purchaser, offerId } = scene
    expect(valueOf(await offersFor.execute(scene.deps, purchaser, { companyId }))).toEqual([
      {
        offerId,
        title: 'Ten hours',
        minutes: 600,
        validityMonths: 12,
        ...price,
        taxLabel: 'VAT 19 %',
        currency: 'EUR',
      },
    ])
  })

  it('that were taken off sale are neither shown nor sold, but stay in the catalogue', async () => {
    const { companyId, purchaser, administrator } = scene
    await portal.db.updateTable('block_offer').set({ archived_at: portal.clock.now() }).execute()
    expect(valueOf(await offersFor.execute(scene.deps, purchaser, { companyId }))).toEqual([])
    expect(await begin(scene)).toMatchObject({ error: { code: 'no_such_offer' } })
    expect(valueOf(await catalogue.execute(scene.deps, administrator, {}))).toMatchObject([
      { isOnSale: false },
    ])
  })
})

describe('starting a checkout', () => {
  it('ST7: asks the provider for our price, currency and quantity, and names purchase and company', async () => {
    const { purchaseId, sessionId } = await beginPurchase(scene)
    expect(sessionOf(scene, sessionId)).toMatchObject({
      client_reference_id: purchaseId,
      customer_email: scene.purchaser.email,
      amount_total: price.grossCents,
      currency: 'eur',
      metadata: { order_id: purchaseId, company_id: scene.companyId },
      success_url: `http://localhost:3000/purchases/${purchaseId}`,
      cancel_url: `http://localhost:3000/companies/${scene.companyId}/hours/buy`,
    })
    expect((await booked(portal)).purchases).toMatchObject([{ status: 'open', session_id: sessionId }])
  })

  it.each([
    ['priceCents', '1'],
    ['grossCents', '1'],
    ['currency', 'HUF'],
    ['quantity', '1000'],
    ['minutes', '6000'],
    ['purchaseId', '0'.repeat(26)],
    ['status', 'paid'],
  ])('ST7, AZ6: refuses the field %s', async (field, value) => {
    const { companyId, offerId, purchaser } = scene
    const refused = await startCheckout.execute(scene.deps, purchaser, { companyId, offerId, [field]: value })
    expect(refused).toMatchObject({ error: { code: 'invalid_input' } })
    expect(creations()).toEqual([])
  })

  it('ST8: whose answer was lost is taken up under the same key: one checkout at the provider', async () => {
    // The SDK itself asks again once when a connection breaks.
    scene.fake.troubles.plan({ kind: 'dropped' }, 2)
    expect(await begin(scene)).toMatchObject({ error: { code: 'payments_unavailable' } })
    expect((await booked(portal)).purchases).toMatchObject([{ status: 'open', session_id: null }])
    const { purchaseId, sessionId } = await beginPurchase(scene)
    expect((await booked(portal)).purchases).toMatchObject([{ id: purchaseId, session_id: sessionId }])
    expect(creations()).toHaveLength(3)
    expect(scene.fake.sessions()).toHaveLength(1)
  })

  it('ST8: pressed twice at once opens one checkout', async () => {
    const both = await Promise.all([begin(scene), begin(scene)])
    expect(new Set(both.map((one) => valueOf(one).url)).size).toBe(1)
    expect(scene.fake.sessions()).toHaveLength(1)
  })

  it('begins anew once a checkout is open, and when the price has changed since a lost answer', async () => {
    const first = await beginPurchase(scene)
    expect((await beginPurchase(scene)).purchaseId).not.toBe(first.purchaseId)
    scene.fake.troubles.plan({ kind: 'unreadable' })
    await begin(scene)
    await portal.db.updateTable('block_offer').set({ net_cents: 200_000 }).execute()
    const { sessionId } = await beginPurchase(scene)
    expect(sessionOf(scene, sessionId).amount_total).toBe(238_000)
  })

  it.each([
    ['is slow', { kind: 'slow', milliseconds: 2_000 }],
    ['is busy', { kind: 'status', status: 429 }],
    ['is broken', { kind: 'status', status: 500 }],
    ['answers nonsense', { kind: 'unreadable' }],
    ['stops half-way', { kind: 'half' }],
  ] as const)(
    'RB1: with a provider that %s says so, loses nothing and can be tried again',
    async (_case, trouble) => {
      scene.fake.troubles.plan(trouble)
      expect(await begin(scene)).toMatchObject({
        error: { code: 'payments_unavailable', message: expect.stringContaining('try again') },
      })
      expect((await begin(scene)).ok).toBe(true)
      expect((await booked(portal)).purchases).toHaveLength(1)
      expect(scene.fake.sessions()).toHaveLength(1)
    },
  )

  it('RB1: with no provider at all says so; the purchase waits', async () => {
    const { companyId, offerId, purchaser } = scene
    const alone = await startCheckout.execute(portal.deps, purchaser, { companyId, offerId })
    expect(alone).toMatchObject({ error: { code: 'payments_unavailable' } })
    const [purchase] = (await booked(portal)).purchases
    const shown = await purchaseStatus.execute(scene.deps, purchaser, { purchaseId: purchase?.id })
    expect(valueOf(shown).standing).toBe('not_begun')
  })

  it('that the provider refuses ends this purchase, so that the next attempt has a key of its own', async () => {
    const refusal = { error: { type: 'invalid_request_error', message: 'No such currency' } }
    scene.fake.troubles.plan({ kind: 'status', status: 400, body: refusal })
    expect(await begin(scene)).toMatchObject({ error: { code: 'payments_refused' } })
    expect((await booked(portal)).purchases).toMatchObject([{ status: 'failed' }])
    expect((await begin(scene)).ok).toBe(true)
    expect((await booked(portal)).purchases).toHaveLength(2)
  })

  it('is for purchasers of the company', async () => {
    const { companyId, offerId, administrator } = scene
    const engineer = await addPerson(portal, { name: 'Emil', memberships: [{ companyId, role: 'engineer' }] })
    const otherId = await addCompany(portal, 'Larkfield Rail Sensors')
    const other = await addPerson(portal, {
      name: 'Iris',
      memberships: [{ companyId: otherId, role: 'purchaser' }],
    })
    const start = (actor: typeof engineer) => startCheckout.execute(scene.deps, actor, { companyId, offerId })
    expect(await start(engineer)).toMatchObject({ error: { code: 'not_permitted' } })
    expect(await start(administrator)).toMatchObject({ error: { code: 'not_permitted' } })
    expect(await start(other)).toMatchObject({ error: { code: 'not_found' } })
    expect(creations()).toEqual([])
  })
})

describe('AZ2: a purchase', () => {
  it('of another company answers as an unknown one, and an engineer learns nothing of it', async () => {
    const { purchaseId } = await payPurchase(scene)
    const otherId = await addCompany(portal, 'Larkfield Rail Sensors')
    const other = await addPerson(portal, {
      name: 'Iris',
      memberships: [{ companyId: otherId, role: 'purchaser' }],
    })
    const { companyId } = scene
    const engineer = await addPerson(portal, { name: 'Emil', memberships: [{ companyId, role: 'engineer' }] })
    const ask = (actor: typeof other, id: string) =>
      purchaseStatus.execute(scene.deps, actor, { purchaseId: id })
    for (const actor of [other, engineer]) {
      expect(await ask(actor, purchaseId)).toEqual(await ask(actor, '0'.repeat(26)))
    }
    expect((await ask(scene.administrator, purchaseId)).ok).toBe(true)
    expect(await companyPurchases.execute(scene.deps, other, { companyId })).toMatchObject({
      error: { code: 'not_found' },
    })
  })

  it('is listed for its company once it has a receipt', async () => {
    const { companyId, purchaser } = scene
    await payPurchase(scene)
    await beginPurchase(scene)
    expect(valueOf(await companyPurchases.execute(scene.deps, purchaser, { companyId }))).toMatchObject([
      { title: 'Ten hours', receiptNumber: 1, grossCents: price.grossCents },
    ])
  })
})

describe('BZ4: validity in calendar months, UTC', () => {
  it.each([
    ['2026-12-01T09:00:00Z', 12, '2027-12-01T09:00:00Z'],
    ['2027-01-31T23:59:59Z', 1, '2027-02-28T23:59:59Z'],
    ['2028-01-31T00:00:00Z', 1, '2028-02-29T00:00:00Z'],
    ['2028-02-29T12:00:00Z', 12, '2029-02-28T12:00:00Z'],
    ['2026-10-31T12:00:00Z', 1, '2026-11-30T12:00:00Z'],
    ['2026-03-28T01:30:00Z', 1, '2026-04-28T01:30:00Z'],
    ['2026-12-31T23:00:00Z', 2, '2027-02-28T23:00:00Z'],
    ['2026-12-15T00:00:00Z', 60, '2031-12-15T00:00:00Z'],
  ])('%s and %d months are %s', (from, months, until) => {
    expect(new Date(afterMonths(Date.parse(from), months)).toISOString()).toBe(until.replace('Z', '.000Z'))
  })
})
