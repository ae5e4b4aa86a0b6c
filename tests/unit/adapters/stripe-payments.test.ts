import { describe, expect, it } from 'vitest'

import { order, paidCheckout, paymentsScene } from './payments-scene'

describe('a checkout', () => {
  it('is created with our price, title and reference, and says where to pay', async () => {
    const { fake, payments } = await paymentsScene()
    const created = await payments.createCheckout(order)
    if (!created.ok) throw new Error(created.error.message)
    expect(created.value.url).toBe(`${fake.url}/pay/${created.value.sessionId}`)
    expect(await payments.getCheckout(created.value.sessionId)).toEqual({
      ok: true,
      value: {
        sessionId: created.value.sessionId,
        status: 'open',
        paymentStatus: 'unpaid',
        amountTotalCents: 360_000,
        currency: 'EUR',
        customerEmail: 'purchaser@osterby.example',
        customerId: null,
        paymentIntentId: null,
        orderId: 'order-1',
        metadata: { order_id: 'order-1', company_id: 'company-1' },
      },
    })
    expect(fake.store.titles.get(created.value.sessionId)).toBe('Twenty hours & “more”')
  })

  it('shows what the provider says was paid, so that a changed amount can be seen', async () => {
    const scene = await paymentsScene()
    const { sessionId } = await paidCheckout(scene)
    scene.fake.tamper(sessionId, { amount_total: 100, currency: 'usd' })
    expect(await scene.payments.getCheckout(sessionId)).toMatchObject({
      ok: true,
      value: { paymentStatus: 'paid', amountTotalCents: 100, currency: 'USD' },
    })
  })

  it('that does not exist is not found', async () => {
    const { payments } = await paymentsScene()
    expect(await payments.getCheckout('cs_test_none')).toMatchObject({
      ok: false,
      error: { code: 'not_found' },
    })
  })

  it('that the provider does not accept is refused with its reason', async () => {
    const { payments } = await paymentsScene()
    const refused = await payments.createCheckout({ ...order, customerEmail: 'nobody' })
    expect(refused).toMatchObject({ ok: false, error: { code: 'refused' } })
    expect(refused.ok ? '' : refused.error.message).toMatch(/customer_email/)
  })

  it('is refused under a wrong key', async () => {
    const { payments } = await paymentsScene({ secretKey: 'wrong_key_entirely' })
    expect(await payments.createCheckout(order)).toMatchObject({ ok: false, error: { code: 'refused' } })
  })
})

describe('creating the same checkout again', () => {
  it('ST8: makes no second one when the first answer was lost and the call repeats itself', async () => {
    const { fake, payments } = await paymentsScene()
    fake.troubles.plan({ kind: 'dropped' })
    const created = await payments.createCheckout(order)
    expect(fake.requests()).toEqual(['POST /v1/checkout/sessions', 'POST /v1/checkout/sessions'])
    expect(fake.sessions().map(({ id }) => id)).toEqual(created.ok ? [created.value.sessionId] : [])
  })

  it('ST8: makes no second one when the caller gave up and comes back later with its stored key', async () => {
    const { fake, payments } = await paymentsScene()
    fake.troubles.plan({ kind: 'dropped' }, 2)
    expect(await payments.createCheckout(order)).toMatchObject({
      ok: false,
      error: { code: 'not_reachable' },
    })
    const created = await payments.createCheckout(order)
    expect(fake.sessions().map(({ id }) => id)).toEqual(created.ok ? [created.value.sessionId] : [])
  })

  it('ST8: is refused when the same key comes with another price', async () => {
    const { fake, payments } = await paymentsScene()
    await payments.createCheckout(order)
    expect(await payments.createCheckout({ ...order, unitAmountCents: 1 })).toMatchObject({
      ok: false,
      error: { code: 'refused' },
    })
    expect(fake.sessions()).toHaveLength(1)
  })
})

describe('a provider in trouble', () => {
  const impatient = { timeoutMilliseconds: 300, retries: 0 }

  it.each([
    ['is busy', { kind: 'status', status: 429 }, 'not_reachable'],
    ['is broken', { kind: 'status', status: 500 }, 'not_reachable'],
    ['answers too late', { kind: 'slow', milliseconds: 5_000 }, 'not_reachable'],
    ['stops half-way', { kind: 'half' }, 'not_reachable'],
    ['answers nonsense', { kind: 'unreadable' }, 'not_reachable'],
    [
      'answers another object',
      { kind: 'status', status: 200, body: { object: 'charge' } },
      'unexpected_reply',
    ],
    ['answers nothing at all', { kind: 'status', status: 200, body: null }, 'unexpected_reply'],
  ] as const)('RB1: that %s is a typed error with a sentence', async (_case, trouble, code) => {
    const { fake, payments } = await paymentsScene(impatient)
    fake.troubles.plan(trouble, 2)
    const reply = await payments.createCheckout(order)
    expect(reply).toMatchObject({ ok: false, error: { code, message: expect.stringMatching(/\w{3}.*\.$/) } })
  })

  it('RB1: that is not there at all is not reachable', async () => {
    const { fake, payments } = await paymentsScene(impatient)
    await fake.close()
    expect(await payments.getCheckout('cs_test_any')).toMatchObject({
      ok: false,
      error: { code: 'not_reachable' },
    })
  })
})

describe('the money of a payment', () => {
  it('is gross = fee + net, to the cent', async () => {
    const scene = await paymentsScene()
    const { paymentIntentId } = await paidCheckout(scene)
    // The fake's rule by hand: 2.9 % of 3,600.00 is 104.40, and 0.30.
    expect(await scene.payments.getBalanceTransaction(paymentIntentId)).toMatchObject({
      ok: true,
      value: { grossCents: 360_000, feeCents: 10_470, netCents: 349_530, currency: 'EUR' },
    })
  })

  it('is not settled while a bank debit is under way', async () => {
    const { fake, payments } = await paymentsScene()
    const created = await payments.createCheckout(order)
    if (!created.ok) throw new Error(created.error.message)
    await fake.payLater(created.value.sessionId)
    const checkout = await payments.getCheckout(created.value.sessionId)
    if (!checkout.ok) throw new Error(checkout.error.message)
    expect(checkout.value).toMatchObject({ status: 'complete', paymentStatus: 'unpaid' })
    expect(await payments.getBalanceTransaction(checkout.value.paymentIntentId ?? '')).toMatchObject({
      ok: false,
      error: { code: 'not_settled' },
    })
  })

  it('ST8: is returned once, however often the refund is asked for under its key', async () => {
    const scene = await paymentsScene()
    const { paymentIntentId } = await paidCheckout(scene)
    const refund = { paymentIntentId, amountCents: 60_000, idempotencyKey: 'refund-1' }
    const first = await scene.payments.refundPayment(refund)
    expect(first).toMatchObject({ ok: true, value: { amountCents: 60_000, currency: 'EUR' } })
    expect(await scene.payments.refundPayment(refund)).toEqual(first)
    expect(scene.fake.store.refunds.size).toBe(1)
  })

  it('is not returned beyond what was paid', async () => {
    const scene = await paymentsScene()
    const { paymentIntentId } = await paidCheckout(scene)
    const refund = { paymentIntentId, amountCents: 360_001, idempotencyKey: 'refund-2' }
    expect(await scene.payments.refundPayment(refund)).toMatchObject({
      ok: false,
      error: { code: 'refused' },
    })
  })

  it('ST9: adds up in a payout: its entries without the payout itself sum to its amount', async () => {
    const scene = await paymentsScene()
    const { paymentIntentId } = await paidCheckout(scene)
    await scene.fake.refund(paymentIntentId, 1_000)
    await scene.fake.payOut()
    const payouts = await scene.payments.listPayouts(0)
    if (!payouts.ok) throw new Error(payouts.error.message)
    expect(payouts.value).toMatchObject([{ amountCents: 348_530, currency: 'EUR', status: 'paid' }])
    const entries = await scene.payments.listPayoutTransactions(payouts.value[0]?.payoutId ?? '')
    if (!entries.ok) throw new Error(entries.error.message)
    expect(entries.value.map(({ type, netCents }) => [type, netCents])).toEqual([
      ['payout', -348_530],
      ['refund', -1_000],
      ['charge', 349_530],
    ])
  })
})

it('ST9: lists every event that was not delivered, across the pages of a long list', async () => {
  const { fake, payments } = await paymentsScene()
  for (let count = 0; count < 70; count += 1) {
    const created = await payments.createCheckout({ ...order, idempotencyKey: `order-${count}` })
    if (!created.ok) throw new Error(created.error.message)
    await fake.payNow(created.value.sessionId)
  }
  const events = await payments.listUndeliveredEvents(0)
  if (!events.ok) throw new Error(events.error.message)
  expect(events.value).toHaveLength(140)
  expect(events.value.filter(({ object }) => object.kind === 'checkout_completed')).toHaveLength(70)
  expect(await payments.listUndeliveredEvents(Date.now() + 60_000)).toEqual({ ok: true, value: [] })
})
