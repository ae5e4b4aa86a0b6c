import { sql } from 'kysely'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { booksOverview, fetchFees } from '@/lib/domain/billing/books.service'
import { settlePayments } from '@/lib/domain/billing/settle-payments'
import { postTime } from '@/lib/domain/hours/posting.service'
import { addTime } from '@/lib/domain/hours/time-draft.service'

import { approveTestScope, openTestEngagement } from '../support/engagement'
import { creditTestBlock } from '../support/hours'
import {
  addOffer,
  booked,
  deliver,
  deliverEvent,
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

const overview = async () => valueOf(await booksOverview.execute(scene.deps, scene.administrator, {}))

/** The stand-in keeps 2.9 % and 30 cents. */
const fee = Math.round((price.grossCents * 29) / 1000) + 30

describe('fee and net', () => {
  it('are fetched from the provider after the credit', async () => {
    await payPurchase(scene)
    expect(await settlePayments(scene.deps)).toEqual({ settled: 1, waiting: 0 })
    expect((await booked(portal)).payments).toMatchObject([
      { fee_cents: fee, net_cents: price.grossCents - fee },
    ])
    expect(await settlePayments(scene.deps)).toEqual({ settled: 0, waiting: 0 })
  })

  it.each([
    ['slow', { kind: 'slow', milliseconds: 2_000 }],
    ['broken', { kind: 'status', status: 500 }],
    ['lying', { kind: 'status', status: 200, body: { object: 'payment_intent', latest_charge: 7 } }],
  ] as const)('RB1: are asked for again later from a provider that is %s', async (_case, trouble) => {
    await payPurchase(scene)
    scene.fake.troubles.plan(trouble)
    expect(await settlePayments(scene.deps)).toEqual({ settled: 0, waiting: 1 })
    expect(valueOf(await fetchFees.execute(scene.deps, scene.administrator, {}))).toEqual({
      settled: 1,
      waiting: 0,
    })
  })

  it('RB1: with no provider are asked for once, not once for every payment', async () => {
    await payPurchase(scene)
    await payPurchase(scene)
    scene.fake.troubles.plan({ kind: 'status', status: 500 }, 2)
    expect(await settlePayments(scene.deps)).toEqual({ settled: 0, waiting: 2 })
    expect(scene.fake.troubles.waiting()).toBe(1)
  })
})

async function workedEngagement() {
  const engagement = await openTestEngagement(portal, 'Larkfield Rail Sensors')
  await approveTestScope(portal, engagement)
  return engagement
}

describe('the books', () => {
  it('are the administrator’s', async () => {
    expect(await booksOverview.execute(scene.deps, scene.purchaser, {})).toMatchObject({
      error: { code: 'not_permitted' },
    })
  })

  it('RB1: open without asking the provider anything', async () => {
    await payPurchase(scene)
    const asked = scene.fake.requests().length
    expect((await overview()).purchases[0]?.checks).toContainEqual({
      name: 'Paid = fee + net',
      state: 'pending',
      sentence: expect.stringContaining('not told its fee yet'),
    })
    expect(scene.fake.requests()).toHaveLength(asked)
  })

  it('agree after a purchase and posted time: payment, fee, net, credit, debit, balance', async () => {
    const engagement = await workedEngagement()
    const buyer = { ...scene, companyId: engagement.companyId, purchaser: engagement.purchaser }
    await payPurchase(buyer)
    await settlePayments(scene.deps)
    const added = await addTime.execute(scene.deps, engagement.consultant, {
      engagementId: engagement.engagementId,
      workKind: 'analysis',
      text: 'Fitted the ring',
      startedAt: '2026-11-30T09:00',
      workedMinutes: '50',
    })
    const { timeEntryId } = valueOf(added)
    valueOf(await postTime.execute(scene.deps, engagement.consultant, { timeEntryId }))
    const books = await overview()
    const figures = { creditedMinutes: 600, debitedMinutes: 54, remainingMinutes: 546 }
    const money = { grossCents: price.grossCents, feeCents: fee, netCents: price.grossCents - fee }
    expect(books.purchases).toMatchObject([{ status: 'paid', receiptNumber: 1, ...money, ...figures }])
    expect(books.totals).toEqual([{ currency: 'EUR', unknownFees: 0, ...money, ...figures }])
    expect(books.accounts).toContainEqual(
      expect.objectContaining({
        companyName: 'Larkfield Rail Sensors',
        creditedMinutes: 600,
        debitedMinutes: 54,
        balanceMinutes: 546,
      }),
    )
    const checks = [...books.purchases, ...books.accounts, books].flatMap((line) => line.checks)
    expect(checks.map((check) => check.name)).toContain('Debit = posted')
    expect(checks.filter((check) => check.state !== 'agrees')).toEqual([])
  })

  const differences: [string, string, () => Promise<unknown>][] = [
    [
      'a payment over the price',
      'Paid = price',
      () => sql`update payment set gross_cents = gross_cents + 1`.execute(portal.db),
    ],
    [
      'a booking under the payment',
      'Paid = fee + net',
      () =>
        sql`update payment set settled_cents = settled_cents - 1, net_cents = net_cents - 1`.execute(
          portal.db,
        ),
    ],
    [
      'a booking in another currency',
      'Paid = fee + net',
      () => sql`update payment set settled_currency = 'USD'`.execute(portal.db),
    ],
    [
      'a block of other hours',
      'Credit = bought',
      () => sql`update hour_block set minutes = 660`.execute(portal.db),
    ],
    [
      'a block valid for too long',
      'Validity',
      () => sql`update hour_block set valid_until = valid_until + 1`.execute(portal.db),
    ],
    [
      'hours on an unpaid purchase',
      'Unpaid',
      () => sql`update purchase set status = 'open'`.execute(portal.db),
    ],
    [
      'a purchase that lost its hours',
      'Credit = bought',
      () => sql`update hour_block set source_id = 'x'`.execute(portal.db),
    ],
    ['a credit that nobody paid for', 'Credit = sold', () => creditTestBlock(portal, scene.companyId)],
    [
      'a gap between receipts',
      'Receipts',
      () => sql`update purchase set receipt_number = 2`.execute(portal.db),
    ],
  ]

  it.each(differences)('name %s', async (_case, name, plant) => {
    await payPurchase(scene)
    await settlePayments(scene.deps)
    await plant()
    const books = await overview()
    const checks = [...books.purchases, ...books.accounts, books].flatMap((line) => line.checks)
    const differing = checks.filter((check) => check.state === 'differs')
    expect(differing.map((check) => check.name)).toContain(name)
    for (const { sentence } of differing) expect(sentence).toMatch(/\w{4}/)
  })

  it('ST9: name posted time that was not debited', async () => {
    const engagement = await workedEngagement()
    await portal.db
      .insertInto('time_entry')
      .values({
        id: portal.deps.ids.newId(),
        engagement_id: engagement.engagementId,
        person_id: engagement.consultant.personId,
        work_kind: 'analysis',
        text: 'Planted',
        started_at: 0,
        worked_seconds: 360,
        posted_minutes: 6,
        posted_at: 0,
        created_at: 0,
      })
      .execute()
    const account = (await overview()).accounts.find(({ companyId }) => companyId === engagement.companyId)
    expect(account?.checks).toContainEqual({
      name: 'Debit = posted',
      state: 'differs',
      sentence: 'Debited 0 min, posted 6 min',
    })
  })

  it('list refused events and those that are settled by hand, and no others', async () => {
    const { sessionId } = await payPurchase(scene)
    const object = { ...sessionOf(scene, sessionId), amount_total: 1 }
    const type = 'checkout.session.completed'
    valueOf(await deliver(scene, scene.fake.buildSignedEvent({ type, object })))
    const [intent] = scene.fake.store.intents.values()
    valueOf(await deliverEvent(scene, await scene.fake.refund(intent?.id ?? '', 100)))
    valueOf(
      await deliver(scene, scene.fake.buildSignedEvent({ type: 'invoice.created', object: { id: 'in_1' } })),
    )
    const { events } = await overview()
    expect(events.map((event) => [event.type, event.isRefused]).toSorted()).toEqual([
      ['charge.refunded', false],
      ['checkout.session.completed', true],
    ])
  })

  it('keep the sums of two currencies apart', async () => {
    await payPurchase(scene)
    const offerId = await addOffer(portal)
    await portal.db.updateTable('block_offer').set({ currency: 'SEK' }).where('id', '=', offerId).execute()
    await payPurchase({ ...scene, offerId })
    const { totals } = await overview()
    expect(
      totals.map(({ currency, grossCents, unknownFees }) => ({ currency, grossCents, unknownFees })),
    ).toEqual([
      { currency: 'EUR', grossCents: price.grossCents, unknownFees: 1 },
      { currency: 'SEK', grossCents: price.grossCents, unknownFees: 1 },
    ])
  })
})
