import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { receiveEvent } from '@/lib/domain/billing/event.service'
import { purchaseStatus } from '@/lib/domain/billing/purchase.service'

import { addCompany } from '../support/people'
import {
  beginPurchase,
  booked,
  deliver,
  deliverEvent,
  openPurchaseScene,
  price,
  sessionOf,
  type PurchaseScene,
} from '../support/purchase-scene'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

const completedType = 'checkout.session.completed'
const nothingMoved = { payments: [], blocks: [], ledger: [], mails: [] }

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

describe('ST1: a delivery that is not proven to be the provider’s', () => {
  const attacks: [
    string,
    (scene: PurchaseScene, eventId: string) => { body: string; signature: string | null },
  ][] = [
    [
      'was changed after it was signed',
      ({ fake }, eventId) => {
        const { body, signature } = fake.signedEvent(eventId)
        return { body: body.replace(String(price.grossCents), String(price.grossCents - 1)), signature }
      },
    ],
    [
      'was read and written again',
      ({ fake }, eventId) => {
        const { body, signature } = fake.signedEvent(eventId)
        return { body: JSON.stringify(JSON.parse(body)), signature }
      },
    ],
    [
      'is signed with another secret',
      ({ fake }, eventId) => {
        const { body } = fake.signedEvent(eventId)
        const object: unknown = JSON.parse(body).data.object
        return fake.buildSignedEvent({ type: completedType, object, secret: 'whsec_of_somebody_else' })
      },
    ],
    ['has no signature', ({ fake }, eventId) => ({ body: fake.signedEvent(eventId).body, signature: null })],
    [
      'has an empty signature',
      ({ fake }, eventId) => ({ body: fake.signedEvent(eventId).body, signature: '' }),
    ],
    [
      'ST2: was signed 301 s ago',
      ({ fake }, eventId) => fake.signedEvent(eventId, portal.clock.now() - 301_000),
    ],
    [
      'ST2: is signed 301 s ahead',
      ({ fake }, eventId) => fake.signedEvent(eventId, portal.clock.now() + 301_000),
    ],
    [
      'is signed and not an event',
      ({ fake }) => fake.buildSignedEvent({ type: completedType, object: { id: 'cs_1' } }),
    ],
  ]

  it.each(attacks)('that %s is refused and leaves no row', async (_case, attack) => {
    const { sessionId } = await beginPurchase(scene)
    const eventId = await scene.fake.payNow(sessionId)
    const { body, signature } = attack(scene, eventId)
    const refused = await receiveEvent.execute(scene.deps, { rawBody: body, signature })
    expect(refused).toMatchObject({ ok: false, error: { code: 'invalid_signature' } })
    expect(await booked(portal)).toMatchObject({ ...nothingMoved, events: [], effects: [] })
  })

  it('ST2: at 300 s either way is accepted', async () => {
    const { sessionId } = await beginPurchase(scene)
    const eventId = await scene.fake.payNow(sessionId)
    for (const skew of [-300_000, 300_000]) {
      const delivery = scene.fake.signedEvent(eventId, portal.clock.now() + skew)
      expect((await deliver(scene, delivery)).ok).toBe(true)
    }
  })
})

describe('ST7: a paid object that differs from our purchase', () => {
  it.each([
    ['amount', { amount_total: price.grossCents - 1 }],
    ['amount of 100 times less', { amount_total: Math.round(price.grossCents / 100) }],
    ['currency', { currency: 'huf' }],
  ] as const)('in its %s credits nothing and is kept as refused with the reason', async (_case, change) => {
    const { sessionId } = await beginPurchase(scene)
    scene.fake.tamper(sessionId, change)
    expect(valueOf(await deliverEvent(scene, await scene.fake.payNow(sessionId)))).toMatchObject({
      outcome: 'refused',
      note: expect.stringMatching(/our price is 2,201\.50\sEUR/),
    })
    const state = await booked(portal)
    expect(state).toMatchObject({ ...nothingMoved, effects: [], purchases: [{ status: 'open' }] })
    expect(state.events).toMatchObject([{ outcome: 'refused' }])
  })

  const foreign: [string, (own: PurchaseScene) => Promise<object>][] = [
    [
      'company',
      async ({ companyId: _ }) => ({
        metadata: { company_id: await addCompany(portal, 'Larkfield Rail Sensors') },
      }),
    ],
    ['missing company', async () => ({ metadata: {} })],
    ['unknown purchase', async () => ({ client_reference_id: '0'.repeat(26) })],
    ['missing purchase', async () => ({ client_reference_id: null })],
    ['checkout', async () => ({ id: 'cs_test_another' })],
    ['payment status', async () => ({ payment_status: 'no_payment_required' })],
    ['missing payment', async () => ({ payment_intent: null })],
    [
      'purchase of somebody else',
      async (own) => ({ client_reference_id: (await beginPurchase(own)).purchaseId }),
    ],
  ]

  it.each(foreign)('in its %s credits nothing', async (_case, change) => {
    const { sessionId } = await beginPurchase(scene)
    await scene.fake.payNow(sessionId)
    const object = { ...sessionOf(scene, sessionId), ...(await change(scene)) }
    const told = await deliver(scene, scene.fake.buildSignedEvent({ type: completedType, object }))
    expect(valueOf(told).outcome).toBe('refused')
    expect(await booked(portal)).toMatchObject({ ...nothingMoved, effects: [] })
  })

  it.each(['checkout.session.expired', 'checkout.session.async_payment_failed'])(
    'does not even end the purchase by %s',
    async (type) => {
      const { purchaseId, sessionId } = await beginPurchase(scene)
      const object = { ...sessionOf(scene, sessionId), id: 'cs_test_another' }
      expect(valueOf(await deliver(scene, scene.fake.buildSignedEvent({ type, object }))).outcome).toBe(
        'refused',
      )
      const { purchaser } = scene
      const shown = await purchaseStatus.execute(scene.deps, purchaser, { purchaseId })
      expect(valueOf(shown).standing).toBe('open')
    },
  )

  it('once refused, the right event is still taken', async () => {
    const { sessionId } = await beginPurchase(scene)
    const eventId = await scene.fake.payNow(sessionId)
    const object = { ...sessionOf(scene, sessionId), amount_total: 1 }
    valueOf(await deliver(scene, scene.fake.buildSignedEvent({ type: completedType, object })))
    expect(valueOf(await deliverEvent(scene, eventId)).outcome).toBe('applied')
  })
})
