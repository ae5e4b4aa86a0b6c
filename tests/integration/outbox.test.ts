import pino from 'pino'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { withTx } from '@/db/tx'
import { createResendMailer } from '@/lib/adapters/resend/resend-mailer'
import { queueMail } from '@/lib/domain/mail'
import { dispatchOutbox, startOutboxDispatcher } from '@/lib/server/outbox-dispatcher'

import { refusals, startResendFake, type ResendFake } from '../fakes/resend/resend-fake'
import { openTestPortal, type TestPortal } from '../support/test-portal'

const minute = 60_000

let portal: TestPortal
let fake: ResendFake

beforeEach(async () => {
  portal = await openTestPortal()
  fake = await startResendFake({ port: 0 })
})

afterEach(async () => {
  await fake.close()
  await portal.close()
})

const sender = () => ({
  deps: portal.deps,
  log: pino({ level: 'silent' }),
  mailer: createResendMailer({
    apiKey: 're_for_tests',
    from: 'Tarn Hollow EMC <portal@tarnhollow.example>',
    apiBase: new URL(fake.url),
    timeoutMilliseconds: 300,
  }),
})

const round = () => dispatchOutbox(sender())

async function queue(key = 'reset:1', to = 'engineer@osterby.example'): Promise<void> {
  const link = `http://localhost:3000/set-password/${key}`
  await withTx(portal.db, (tx) =>
    queueMail(tx, portal.deps, {
      to,
      dedupeKey: key,
      mail: { kind: 'one_time_link', purpose: 'password_reset', link, expiresAt: portal.clock.now() },
    }),
  )
}

const rows = () => portal.db.selectFrom('outbox_message').selectAll().orderBy('dedupe_key').execute()

describe('the outbox', () => {
  it('sends what is due once, in the practice’s name, and forgets the text that may let somebody in', async () => {
    await queue()
    expect(await round()).toBe(1)
    expect(await round()).toBe(0)
    expect(fake.messages()).toMatchObject([
      {
        to: ['engineer@osterby.example'],
        subject: expect.stringContaining('Tarn Hollow EMC'),
        text: expect.stringContaining('http://localhost:3000/set-password/reset:1'),
        html: expect.stringContaining('http://localhost:3000/set-password/reset:1'),
      },
    ])
    expect(await rows()).toMatchObject([{ sent_at: portal.clock.now(), attempts: 0, payload: '{}' }])
  })

  it('sends nothing of a transaction that failed', async () => {
    const failing = withTx(portal.db, async (tx) => {
      await queueMail(tx, portal.deps, {
        to: 'engineer@osterby.example',
        dedupeKey: 'never',
        mail: { kind: 'one_time_link', purpose: 'invitation', link: 'http://localhost:3000/x', expiresAt: 0 },
      })
      throw new Error('the cause fell through')
    })
    await expect(failing).rejects.toThrow('fell through')
    expect(await round()).toBe(0)
  })

  it('queues one message for one cause', async () => {
    await queue()
    await queue()
    expect(await round()).toBe(1)
    expect(fake.messages()).toHaveLength(1)
  })
})

describe('RB1: a mail service in trouble', () => {
  it.each([
    ['is busy (429)', refusals.busy],
    ['is broken (500)', refusals.broken],
    ['accepts and answers too late', { kind: 'slow', milliseconds: 1_000 }],
    ['accepts and loses the answer', { kind: 'dropped' }],
    ['answers nonsense', { kind: 'unreadable' }],
    ['stops half-way', { kind: 'half' }],
  ] as const)(
    'that %s: the message stays queued and is sent once, a minute later',
    async (_case, trouble) => {
      await queue()
      fake.troubles.plan(trouble)
      expect(await round()).toBe(0)
      expect(await rows()).toMatchObject([
        {
          sent_at: null,
          attempts: 1,
          next_attempt_at: portal.clock.now() + minute,
          last_error: expect.any(String),
        },
      ])
      portal.clock.advance(minute - 1)
      expect(await round()).toBe(0)
      portal.clock.advance(1)
      expect(await round()).toBe(1)
      expect(fake.messages()).toHaveLength(1)
    },
  )

  it('that is not there: the message waits for it', async () => {
    await queue()
    const port = Number(new URL(fake.url).port)
    await fake.close()
    expect(await round()).toBe(0)
    fake = await startResendFake({ port })
    portal.clock.advance(minute)
    expect(await round()).toBe(1)
    expect(fake.messages()).toHaveLength(1)
  })

  it('waits 1, 5, 30 minutes and longer between ten attempts, then gives up and keeps the reason', async () => {
    await queue()
    fake.troubles.plan(refusals.broken, 100)
    const waits: number[] = []
    for (let attempt = 1; attempt <= 9; attempt += 1) {
      await round()
      const [row] = await rows()
      const wait = (row?.next_attempt_at ?? 0) - portal.clock.now()
      waits.push(wait / minute)
      portal.clock.advance(wait)
    }
    expect(waits).toEqual([1, 5, 30, 60, 120, 240, 480, 720, 1440])
    await round()
    fake.troubles.clear()
    portal.clock.advance(10 * 365 * 24 * 60 * minute)
    expect(await round()).toBe(0)
    expect(await rows()).toMatchObject([
      { attempts: 10, sent_at: null, last_error: expect.stringMatching(/\w/) },
    ])
    expect(fake.messages()).toEqual([])
  })

  it('that refuses one message for good is not asked again for it, and sends the others', async () => {
    await queue('a:1')
    await queue('b:1', 'purchaser@osterby.example')
    fake.troubles.plan(refusals.refused)
    expect(await round()).toBe(1)
    portal.clock.advance(10 * 365 * 24 * 60 * minute)
    expect(await round()).toBe(0)
    expect(await rows()).toMatchObject([
      { sent_at: null, attempts: 1, last_error: expect.stringContaining('not accepted') },
      { attempts: 0, last_error: null },
    ])
  })

  it('a stored message that cannot be written out does not hold up those behind it', async () => {
    await queue('a:1')
    await portal.db.updateTable('outbox_message').set({ payload: '{"kind":"unheard_of"}' }).execute()
    portal.clock.advance(1)
    await queue('b:1')
    expect(await round()).toBe(1)
    expect(await rows()).toMatchObject([{ sent_at: null, last_error: expect.any(String) }, { attempts: 0 }])
  })

  it('SE5: an address that could be read as two reaches nobody', async () => {
    await queue('a:1', 'engineer@osterby.example,thief@elsewhere.example')
    expect(await round()).toBe(0)
    expect(fake.messages()).toEqual([])
  })
})

describe('the dispatcher', () => {
  it('finds new mail by itself, one round at a time, until it is stopped', async () => {
    const stop = startOutboxDispatcher(sender(), 10)
    await queue('a:1')
    await vi.waitFor(() => expect(fake.messages()).toHaveLength(1))
    fake.troubles.plan({ kind: 'slow', milliseconds: 150 })
    await queue('b:1')
    await vi.waitFor(() => expect(fake.messages()).toHaveLength(2))
    await vi.waitFor(async () => expect((await rows()).every((row) => row.sent_at !== null)).toBe(true))
    stop()
    // A round that was under way may still end.
    await new Promise((resolve) => setTimeout(resolve, 50))
    await queue('c:1')
    await new Promise((resolve) => setTimeout(resolve, 100))
    expect(fake.messages()).toHaveLength(2)
  })
})
