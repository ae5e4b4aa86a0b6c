import path from 'node:path'

import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { openDatabase } from '@/db/client'
import { receiveEvent } from '@/lib/domain/billing/event.service'
import { purchaseStatus } from '@/lib/domain/billing/purchase.service'
import { mailSchema } from '@/lib/domain/mail'

import {
  beginPurchase,
  booked,
  deliver,
  deliverEvent,
  endState,
  openPurchaseScene,
  payPurchase,
  price,
  sessionOf,
  type PurchaseScene,
} from '../support/purchase-scene'
import { openTestPortal, testStart, type TestPortal } from '../support/test-portal'
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

const standing = async (purchaseId: string) =>
  valueOf(await purchaseStatus.execute(scene.deps, scene.purchaser, { purchaseId })).standing

describe('a paid checkout', () => {
  it('makes payment, receipt, block, credit and mail in one go', async () => {
    const { purchaseId, sessionId } = await payPurchase(scene)
    const state = await booked(portal)
    expect(state.purchases).toEqual([
      { id: purchaseId, status: 'paid', session_id: sessionId, receipt_number: 1, paid_at: testStart },
    ])
    expect(state.payments).toEqual([
      { purchase_id: purchaseId, gross_cents: price.grossCents, fee_cents: null, net_cents: null },
    ])
    expect(state.blocks).toEqual([
      {
        company_id: scene.companyId,
        minutes: 600,
        valid_from: testStart,
        valid_until: Date.UTC(2027, 11, 1, 9),
      },
    ])
    expect(state.ledger).toEqual([{ kind: 'credit', minutes: 600, source_id: purchaseId }])
    expect(state.mails).toHaveLength(1)
    expect(state.mails[0]?.recipient).toBe(scene.purchaser.email)
    expect(mailSchema.parse(JSON.parse(state.mails[0]?.payload ?? ''))).toEqual({
      kind: 'receipt',
      receiptNumber: 1,
      companyName: 'Osterby Pump Controls',
      title: 'Ten hours',
      minutes: 600,
      ...price,
      taxLabel: 'VAT 19 %',
      currency: 'EUR',
      paidAt: testStart,
      balanceMinutes: 600,
      validUntil: Date.UTC(2027, 11, 1, 9),
    })
    expect(state.events).toMatchObject([{ type: completedType, outcome: 'applied' }])
    expect(state.effects).toEqual([{ object_id: sessionId, effect: 'credit' }])
  })

  it('numbers its receipts from 1 without a gap, whatever was refused or given up between', async () => {
    await payPurchase(scene)
    const lapsed = await beginPurchase(scene)
    valueOf(await deliverEvent(scene, await scene.fake.expire(lapsed.sessionId)))
    const wrong = await beginPurchase(scene)
    scene.fake.tamper(wrong.sessionId, { amount_total: 1 })
    valueOf(await deliverEvent(scene, await scene.fake.payNow(wrong.sessionId)))
    const events: string[] = []
    for (let count = 0; count < 3; count += 1) {
      events.push(await scene.fake.payNow((await beginPurchase(scene)).sessionId))
    }
    await Promise.all(events.map((eventId) => deliverEvent(scene, eventId)))
    const numbers = (await booked(portal)).purchases.flatMap(({ receipt_number }) => receipt_number ?? [])
    expect(numbers.toSorted()).toEqual([1, 2, 3, 4])
  })

  it('whose storing fails half-way leaves nothing, not even the event, and is taken when it comes again', async () => {
    const { sessionId } = await beginPurchase(scene)
    const eventId = await scene.fake.payNow(sessionId)
    const broken = { ...scene.deps, ids: { ...scene.deps.ids, newId: () => 'too short' } }
    const { body, signature } = scene.fake.signedEvent(eventId)
    await expect(receiveEvent.execute(broken, { rawBody: body, signature })).rejects.toThrow('CHECK')
    expect(await booked(portal)).toMatchObject({ ...nothingMoved, events: [], effects: [] })
    expect(valueOf(await deliverEvent(scene, eventId)).outcome).toBe('applied')
  })
})

describe('ST3: an event that comes more than once', () => {
  it('fifty times at once credits once', async () => {
    const { sessionId } = await beginPurchase(scene)
    const eventId = await scene.fake.payNow(sessionId)
    const answers = await Promise.all(Array.from({ length: 50 }, () => deliverEvent(scene, eventId)))
    const outcomes = answers.map((answer) => valueOf(answer).outcome).toSorted()
    expect(outcomes.filter((outcome) => outcome === 'applied')).toHaveLength(1)
    expect(outcomes.filter((outcome) => outcome === 'already_applied')).toHaveLength(49)
    const state = await booked(portal)
    expect(state.ledger).toHaveLength(1)
    expect(state.payments).toHaveLength(1)
    expect(state.mails).toHaveLength(1)
    expect(state.events).toHaveLength(1)
  })

  it('again after the database was closed and opened has no effect', async () => {
    const { eventId } = await payPurchase(scene)
    const before = await booked(portal)
    const again = openDatabase(path.join(portal.folder, 'portal.sqlite'))
    const reopened = { ...scene, deps: { ...scene.deps, db: again } }
    const answers = await Promise.all(Array.from({ length: 50 }, () => deliverEvent(reopened, eventId)))
    expect(new Set(answers.map((answer) => valueOf(answer).outcome))).toEqual(new Set(['already_applied']))
    await again.destroy()
    expect(await booked(portal)).toEqual(before)
  })
})

describe('ST4: two events for one change', () => {
  it('credit once; the second is recorded as already applied', async () => {
    const { sessionId } = await payPurchase(scene)
    const before = await endState(portal)
    const twin = scene.fake.buildSignedEvent({ type: completedType, object: sessionOf(scene, sessionId) })
    expect(valueOf(await deliver(scene, twin)).outcome).toBe('already_applied')
    expect(await endState(portal)).toEqual(before)
    expect((await booked(portal)).events.map(({ outcome }) => outcome).toSorted()).toEqual([
      'already_applied',
      'applied',
    ])
  })

  it('at the same time credit once', async () => {
    const { sessionId } = await beginPurchase(scene)
    await scene.fake.payNow(sessionId)
    const object = sessionOf(scene, sessionId)
    const twins = Array.from({ length: 20 }, () =>
      scene.fake.buildSignedEvent({ type: completedType, object }),
    )
    const answers = await Promise.all(twins.map((twin) => deliver(scene, twin)))
    expect(answers.filter((answer) => valueOf(answer).outcome === 'applied')).toHaveLength(1)
    expect((await booked(portal)).ledger).toHaveLength(1)
  })
})

const permutations = <T>(items: readonly T[]): T[][] =>
  items.length <= 1
    ? [[...items]]
    : items.flatMap((item, index) => permutations(items.toSpliced(index, 1)).map((rest) => [item, ...rest]))

describe('ST5: the order of events', () => {
  const kinds = ['completed', 'succeeded', 'expired'] as const

  it.each(permutations(kinds).map((order) => [order] as const))(
    '%s ends in the same state',
    async (order) => {
      const { purchaseId, sessionId } = await beginPurchase(scene)
      const object = sessionOf(scene, sessionId)
      const completed = await scene.fake.payLater(sessionId)
      const succeeded = await scene.fake.settleLater(sessionId, 'succeeded')
      const expired = scene.fake.buildSignedEvent({
        type: 'checkout.session.expired',
        object: { ...object, status: 'expired' },
      })
      const deliveries = {
        completed: scene.fake.signedEvent(completed),
        succeeded: scene.fake.signedEvent(succeeded),
        expired,
      }
      for (const kind of order) valueOf(await deliver(scene, deliveries[kind]))
      expect(await endState(portal)).toMatchObject({
        purchases: [{ id: purchaseId, status: 'paid', receipt_number: 1, session_id: sessionId }],
        payments: [{ purchase_id: purchaseId, gross_cents: price.grossCents }],
        ledger: [{ kind: 'credit', minutes: 600 }],
        blocks: [{ minutes: 600 }],
        mails: [{ kind: 'receipt' }],
      })
    },
  )

  it.each(permutations(['completed', 'failed', 'expired'] as const).map((order) => [order] as const))(
    '%s, without money, ends as failed',
    async (order) => {
      const { purchaseId, sessionId } = await beginPurchase(scene)
      const object = sessionOf(scene, sessionId)
      const completed = await scene.fake.payLater(sessionId)
      const failed = await scene.fake.settleLater(sessionId, 'failed')
      const deliveries = {
        completed: scene.fake.signedEvent(completed),
        failed: scene.fake.signedEvent(failed),
        expired: scene.fake.buildSignedEvent({
          type: 'checkout.session.expired',
          object: { ...object, status: 'expired' },
        }),
      }
      for (const kind of order) valueOf(await deliver(scene, deliveries[kind]))
      expect(await endState(portal)).toMatchObject({ ...nothingMoved, purchases: [{ status: 'failed' }] })
      expect(await standing(purchaseId)).toBe('failed')
    },
  )

  it('a bank debit is waited for before the hours are there', async () => {
    const { purchaseId, sessionId } = await beginPurchase(scene)
    valueOf(await deliverEvent(scene, await scene.fake.payLater(sessionId)))
    expect(await standing(purchaseId)).toBe('arriving')
    expect(await booked(portal)).toMatchObject(nothingMoved)
    valueOf(await deliverEvent(scene, await scene.fake.settleLater(sessionId, 'succeeded')))
    expect(await standing(purchaseId)).toBe('paid')
  })

  it('a page that lapsed leaves a purchase that can be begun anew', async () => {
    const { purchaseId, sessionId } = await beginPurchase(scene)
    valueOf(await deliverEvent(scene, await scene.fake.expire(sessionId)))
    expect(await standing(purchaseId)).toBe('expired')
    expect((await beginPurchase(scene)).purchaseId).not.toBe(purchaseId)
  })

  it('an event that outruns the answer to our own call is taken, and the checkout is noted by it', async () => {
    const { purchaseId, sessionId } = await beginPurchase(scene)
    await portal.db.updateTable('purchase').set({ session_id: null }).execute()
    expect(await standing(purchaseId)).toBe('not_begun')
    valueOf(await deliverEvent(scene, await scene.fake.payNow(sessionId)))
    expect((await booked(portal)).purchases).toMatchObject([{ status: 'paid', session_id: sessionId }])
  })
})

describe('ST6: the return page', () => {
  it('before the event shows that it waits, and credits nothing however often it is looked at', async () => {
    const { purchaseId, sessionId } = await beginPurchase(scene)
    const eventId = await scene.fake.payNow(sessionId)
    for (let look = 0; look < 5; look += 1) expect(await standing(purchaseId)).toBe('open')
    expect(await booked(portal)).toMatchObject(nothingMoved)
    valueOf(await deliverEvent(scene, eventId))
    expect(await standing(purchaseId)).toBe('paid')
  })

  it('after the event shows the credit', async () => {
    const { purchaseId } = await payPurchase(scene)
    const shown = await purchaseStatus.execute(scene.deps, scene.purchaser, { purchaseId })
    expect(valueOf(shown)).toMatchObject({
      standing: 'paid',
      receiptNumber: 1,
      validUntil: Date.UTC(2027, 11, 1, 9),
      ...price,
    })
  })

  it('and the event at the same time credit once', async () => {
    const { purchaseId, sessionId } = await beginPurchase(scene)
    const eventId = await scene.fake.payNow(sessionId)
    await Promise.all(
      Array.from({ length: 20 }, (_, index) =>
        index % 2 === 0 ? deliverEvent(scene, eventId) : standing(purchaseId),
      ),
    )
    expect((await booked(portal)).ledger).toHaveLength(1)
  })

  it('without any event stays as it is', async () => {
    const { purchaseId } = await beginPurchase(scene)
    portal.clock.advance(30 * 24 * 3_600_000)
    expect(await standing(purchaseId)).toBe('open')
    expect(await booked(portal)).toMatchObject(nothingMoved)
  })
})

describe('ST10: an event of a type without effect', () => {
  it('is recorded as ignored and changes nothing', async () => {
    await payPurchase(scene)
    const before = await endState(portal)
    const unknown = scene.fake.buildSignedEvent({ type: 'customer.created', object: { id: 'cus_1' } })
    expect(valueOf(await deliver(scene, unknown)).outcome).toBe('ignored')
    const [charge] = scene.fake.store.charges.values()
    const refund = await scene.fake.refund(charge?.payment_intent ?? '', 100)
    expect(valueOf(await deliverEvent(scene, refund)).outcome).toBe('ignored')
    expect(await endState(portal)).toEqual(before)
    expect((await booked(portal)).events.map(({ outcome }) => outcome).toSorted()).toEqual([
      'applied',
      'ignored',
      'ignored',
    ])
  })
})
