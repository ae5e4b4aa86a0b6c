import { execFileSync } from 'node:child_process'

import Stripe from 'stripe'
import { describe, expect, it } from 'vitest'

import { signatureHeader } from '../../fakes/stripe/webhook-signature'
import { order, paidCheckout, paymentsScene, webhookSecret } from './payments-scene'

async function delivery() {
  const scene = await paymentsScene()
  const { eventId, sessionId } = await paidCheckout(scene)
  const now = Date.now()
  return { ...scene, sessionId, eventId, now, ...scene.fake.signedEvent(eventId, now) }
}

describe('a delivery that is genuine', () => {
  it('ST1: becomes an event with the checkout that it is about', async () => {
    const { payments, body, signature, now, eventId, sessionId } = await delivery()
    expect(payments.verifyEvent(body, signature, now)).toMatchObject({
      ok: true,
      value: {
        id: eventId,
        type: 'checkout.session.completed',
        objectId: sessionId,
        object: {
          kind: 'checkout_completed',
          checkout: { sessionId, paymentStatus: 'paid', amountTotalCents: 360_000, orderId: order.orderId },
        },
      },
    })
  })

  it.each([
    ['300 s old', 300],
    ['300 s ahead', -300],
  ])('ST2: is taken when it is %s', async (_case, age) => {
    const { payments, fake, eventId, now } = await delivery()
    const { body, signature } = fake.signedEvent(eventId, now - age * 1000)
    expect(payments.verifyEvent(body, signature, now).ok).toBe(true)
  })

  it('ST10: of a type without effect is unknown, with its name and object kept', async () => {
    const { payments, fake } = await paymentsScene()
    const { body, signature } = fake.buildSignedEvent({ type: 'customer.created', object: { id: 'cus_1' } })
    expect(payments.verifyEvent(body, signature, Date.now())).toMatchObject({
      ok: true,
      value: { type: 'customer.created', objectId: 'cus_1', object: { kind: 'unknown' } },
    })
  })
})

describe('a delivery that is not genuine', () => {
  it.each([
    ['changed by one digit', (body: string) => body.replace('360000', '360001')],
    ['written again as JSON', (body: string) => JSON.stringify(JSON.parse(body))],
    ['ended with a line break', (body: string) => `${body}\n`],
    ['empty', () => ''],
  ])('ST1: is refused when its body is %s', async (_case, change) => {
    const { payments, body, signature, now } = await delivery()
    expect(change(body)).not.toBe(body)
    expect(payments.verifyEvent(change(body), signature, now)).toEqual({
      ok: false,
      error: 'invalid_signature',
    })
  })

  it('ST1: is refused when it was signed with another secret', async () => {
    const { payments, body, now } = await delivery()
    const signature = signatureHeader(body, 'whsec_of_somebody_else', now)
    expect(payments.verifyEvent(body, signature, now)).toEqual({ ok: false, error: 'invalid_signature' })
  })

  it.each([
    ['none', () => null],
    ['an empty one', () => ''],
    ['one without a signature', (header: string) => header.replace(/,v1=.*/, '')],
    ['one without a time', (header: string) => header.replace(/^t=\d+,/, '')],
    ['one with two times', (header: string) => `t=1,${header}`],
    ['one whose signature has no value', (header: string) => header.replace(/v1=.*/, 'v1')],
    ['one of another scheme', (header: string) => header.replace('v1=', 'v0=')],
    ['one that is cut short', (header: string) => header.slice(0, -1)],
  ])('ST1: is refused when its signature header is %s', async (_case, change) => {
    const { payments, body, signature, now } = await delivery()
    expect(payments.verifyEvent(body, change(signature), now)).toEqual({
      ok: false,
      error: 'invalid_signature',
    })
  })

  it.each([
    ['301 s old', 301, 'too_old'],
    ['a day old', 86_400, 'too_old'],
    ['301 s in the future', -301, 'in_future'],
    ['a day in the future', -86_400, 'in_future'],
  ])('ST2: is refused when it is %s, though rightly signed', async (_case, age, refusal) => {
    const { payments, fake, eventId, now } = await delivery()
    const { body, signature } = fake.signedEvent(eventId, now - age * 1000)
    expect(payments.verifyEvent(body, signature, now)).toEqual({ ok: false, error: refusal })
  })

  it.each([
    ['a handled type with an object of another shape', 'checkout.session.completed', { id: 'cs_1' }],
    ['an amount that is no whole number', 'payout.paid', { id: 'po_1', object: 'payout', amount: 1.5 }],
    ['no object', 'payout.paid', null],
  ])('is malformed when it carries %s', async (_case, type, object) => {
    const { payments, fake } = await paymentsScene()
    const { body, signature } = fake.buildSignedEvent({ type, object })
    expect(payments.verifyEvent(body, signature, Date.now())).toEqual({ ok: false, error: 'malformed' })
  })

  it('is malformed when it is signed but no JSON', async () => {
    const { payments } = await paymentsScene()
    const now = Date.now()
    const signature = signatureHeader('{"id":', webhookSecret, now)
    expect(payments.verifyEvent('{"id":', signature, now)).toEqual({ ok: false, error: 'malformed' })
  })
})

describe('every kind of event that has an effect', () => {
  it('is read from what the fake sends in the life of three payments', async () => {
    const scene = await paymentsScene()
    const { fake, payments } = scene
    const { paymentIntentId } = await paidCheckout(scene)
    const open = async (key: string) => {
      const created = await payments.createCheckout({ ...order, idempotencyKey: key })
      return created.ok ? created.value.sessionId : ''
    }
    const [arriving, failing, expiring] = [await open('a'), await open('b'), await open('c')]
    await fake.payLater(arriving)
    await fake.settleLater(arriving, 'succeeded')
    await fake.payLater(failing)
    await fake.settleLater(failing, 'failed')
    await fake.expire(expiring)
    await fake.refund(paymentIntentId, 500)
    await fake.openDispute(paymentIntentId)
    await fake.closeDispute([...fake.store.disputes.keys()][0] ?? '', 'lost')
    await fake.payOut()
    const kinds = fake.events().map(({ event }) => {
      const { body, signature } = fake.signedEvent(event.id)
      const read = payments.verifyEvent(body, signature, Date.now())
      return read.ok ? read.value.object.kind : read.error
    })
    expect(kinds).toEqual([
      'unknown',
      'checkout_completed',
      'checkout_completed',
      'checkout_paid_later',
      'checkout_completed',
      'checkout_failed_later',
      'checkout_expired',
      'charge_refunded',
      'dispute_opened',
      'dispute_closed',
      'payout_paid',
    ])
  })
})

describe('the signature of the fake', () => {
  const now = Date.UTC(2026, 11, 1)
  const body = '{\n  "name": "Ω & µ"\n}'

  it('equals the one that the SDK makes', () => {
    const theirs = Stripe.webhooks.generateTestHeaderString({
      payload: body,
      secret: webhookSecret,
      timestamp: now / 1000,
    })
    expect(signatureHeader(body, webhookSecret, now)).toBe(theirs)
  })

  it('equals the HMAC-SHA-256 (RFC 2104) of OpenSSL', () => {
    const printed = execFileSync('openssl', ['dgst', '-sha256', '-hmac', webhookSecret], {
      input: `${now / 1000}.${body}`,
      encoding: 'utf8',
    })
    const code = /([0-9a-f]{64})\s*$/.exec(printed)?.[1]
    expect(signatureHeader(body, webhookSecret, now)).toBe(`t=${now / 1000},v1=${code}`)
  })
})
