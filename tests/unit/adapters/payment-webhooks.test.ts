import { createServer, type Server } from 'node:http'

import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { order, paymentsScene } from './payments-scene'

type Received = { readonly id: string; readonly type: string }

let portal: Server
let received: Received[]
let answers: number[]

beforeEach(async () => {
  received = []
  answers = []
  portal = createServer((request, response) => {
    const chunks: Buffer[] = []
    request.on('data', (chunk: Buffer) => chunks.push(chunk))
    request.on('end', () => {
      received.push(JSON.parse(Buffer.concat(chunks).toString('utf8')) as Received)
      response.writeHead(answers.shift() ?? 200).end()
    })
  })
  await new Promise<void>((resolve) => portal.listen(0, '127.0.0.1', resolve))
})

afterEach(() => new Promise<void>((resolve) => void portal.close(() => resolve()).closeAllConnections()))

async function scene() {
  const address = portal.address()
  const port = typeof address === 'object' ? address?.port : undefined
  const made = await paymentsScene(
    {},
    { webhookUrl: `http://127.0.0.1:${port}/hook`, retryDelaysMilliseconds: [20, 20] },
  )
  const created = await made.payments.createCheckout(order)
  if (!created.ok) throw new Error(created.error.message)
  return { ...made, sessionId: created.value.sessionId }
}

const completions = () => received.filter(({ type }) => type === 'checkout.session.completed')

describe('the events of the fake', () => {
  it('ST10: are sent again until the answer is a success', async () => {
    const { fake, sessionId } = await scene()
    answers = [500, 500, 503]
    await fake.payNow(sessionId)
    await vi.waitFor(() => expect(fake.events().every(({ isDelivered }) => isDelivered)).toBe(true))
    const attempts = fake.events().flatMap((record) => record.attempts)
    expect(attempts.toSorted()).toEqual([200, 200, 500, 500, 503])
  })

  it('ST9: stay in the list of undelivered ones until they are taken', async () => {
    const { fake, payments, sessionId } = await scene()
    answers = [500, 500, 500, 500, 500, 500]
    await fake.payNow(sessionId)
    await vi.waitFor(() => expect(answers).toEqual([]))
    const missed = await payments.listUndeliveredEvents(0)
    expect(missed.ok && missed.value.map(({ type }) => type).sort()).toEqual([
      'charge.succeeded',
      'checkout.session.completed',
    ])
  })

  it('ST3: come fifty times at once when they are told to', async () => {
    const { fake, sessionId } = await scene()
    const eventId = await fake.payNow(sessionId)
    await fake.deliver(eventId, 49, true)
    expect(completions().map(({ id }) => id)).toEqual(Array.from({ length: 50 }, () => eventId))
  })

  it('ST5: come in reverse when they are told to', async () => {
    const { fake, sessionId } = await scene()
    fake.setWebhookMode({ order: 'newest_first' })
    await fake.payLater(sessionId)
    await fake.settleLater(sessionId, 'succeeded')
    await vi.waitFor(() => expect(received).toHaveLength(2), { timeout: 4_000 })
    expect(received.map(({ type }) => type)).toEqual([
      'checkout.session.async_payment_succeeded',
      'checkout.session.completed',
    ])
  })
})

describe('the payment page of the fake', () => {
  const send = (url: string, choice: string) =>
    fetch(url, { method: 'POST', body: new URLSearchParams({ with: choice }), redirect: 'manual' })

  it('says that no money moves, and shows what is bought with its markup disarmed', async () => {
    const { fake, payments } = await scene()
    const blockTitle = '<script>alert(1)</script>'
    const created = await payments.createCheckout({ ...order, blockTitle, idempotencyKey: 'markup' })
    if (!created.ok) throw new Error(created.error.message)
    const shown = await (await fetch(`${fake.url}/pay/${created.value.sessionId}`)).text()
    expect(shown).toContain('Test payment – no money moves')
    expect(shown).toContain('3,600.00 EUR')
    expect(shown).toContain('&lt;script&gt;')
    expect(shown).not.toContain('<script')
  })

  it('takes an accepted card, tells the portal and sends the browser back with the session', async () => {
    const { fake, sessionId } = await scene()
    const reply = await send(`${fake.url}/pay/${sessionId}`, 'accepted')
    expect(reply.status).toBe(303)
    expect(reply.headers.get('location')).toBe(`http://localhost:3000/hours/thanks?session=${sessionId}`)
    expect(completions()).toHaveLength(1)
  })

  it('stays on a declined card with a sentence, and the payment stays open', async () => {
    const { fake, sessionId } = await scene()
    const reply = await send(`${fake.url}/pay/${sessionId}`, 'declined')
    expect(await reply.text()).toMatch(/declined and nothing was paid/)
    expect(fake.sessions()[0]).toMatchObject({ status: 'open', payment_status: 'unpaid' })
    expect(received).toEqual([])
  })

  it('takes the same payment only once', async () => {
    const { fake, sessionId } = await scene()
    await send(`${fake.url}/pay/${sessionId}`, 'accepted')
    await send(`${fake.url}/pay/${sessionId}`, 'accepted')
    expect(fake.store.charges.size).toBe(1)
  })
})
