import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { createResendMailer, type ResendSettings } from '@/lib/adapters/resend/resend-mailer'
import type { OutgoingMail } from '@/lib/ports/mailer'

import { refusals, startResendFake, type ResendFake } from '../../fakes/resend/resend-fake'

const mail: OutgoingMail = {
  to: 'engineer@osterby.example',
  subject: 'Scope to approve: 48 V buck, Ω and µ',
  html: '<p>Hello</p>',
  text: 'Hello',
  idempotencyKey: 'scope:1',
}

let fake: ResendFake

beforeEach(async () => {
  fake = await startResendFake({ port: 0 })
})

afterEach(() => fake.close())

const mailer = (settings: Partial<ResendSettings> = {}) =>
  createResendMailer({
    apiKey: 're_for_tests',
    from: 'Tarn Hollow EMC <portal@tarnhollow.example>',
    apiBase: new URL(fake.url),
    ...settings,
  })

describe('a message', () => {
  it('arrives as it was written and answers with the id of the service', async () => {
    const sent = await mailer().send(mail)
    expect(fake.messages()).toMatchObject([
      {
        id: sent.ok ? sent.value.providerId : '',
        from: 'Tarn Hollow EMC <portal@tarnhollow.example>',
        to: ['engineer@osterby.example'],
        subject: mail.subject,
        html: mail.html,
        text: mail.text,
      },
    ])
  })

  it('RB1: is not sent twice when the answer was lost and it is tried again', async () => {
    fake.troubles.plan({ kind: 'dropped' })
    expect(await mailer().send(mail)).toMatchObject({ ok: false, error: { code: 'unavailable' } })
    expect(await mailer().send(mail)).toMatchObject({ ok: true })
    expect(fake.messages()).toHaveLength(1)
  })

  it('is rejected when its key was used for another message', async () => {
    await mailer().send(mail)
    expect(await mailer().send({ ...mail, subject: 'Another' })).toMatchObject({
      ok: false,
      error: { code: 'rejected' },
    })
    expect(fake.messages()).toHaveLength(1)
  })
})

describe('a mail service in trouble', () => {
  it.each([
    ['refuses the message', refusals.refused, 'rejected'],
    ['is busy (429)', refusals.busy, 'unavailable'],
    ['is broken (500)', refusals.broken, 'unavailable'],
    ['answers nonsense', { kind: 'unreadable' }, 'unavailable'],
    ['stops half-way', { kind: 'half' }, 'unavailable'],
    ['answers too late', { kind: 'slow', milliseconds: 5_000 }, 'unavailable'],
    ['accepts without an id', { kind: 'status', status: 200, body: {} }, 'unavailable'],
    ['refuses with null', { kind: 'status', status: 500, body: null }, 'unavailable'],
  ] as const)('RB1: that %s is a typed error with a sentence', async (_case, trouble, code) => {
    fake.troubles.plan(trouble)
    expect(await mailer({ timeoutMilliseconds: 300 }).send(mail)).toMatchObject({
      ok: false,
      error: { code, message: expect.stringMatching(/\w{3}.*\.$/) },
    })
  })

  it('RB1: that is not there at all is unavailable', async () => {
    await fake.close()
    expect(await mailer().send(mail)).toMatchObject({ ok: false, error: { code: 'unavailable' } })
  })

  it('keeps a message for later when our own key is wrong', async () => {
    expect(await mailer({ apiKey: 'wrong' }).send(mail)).toMatchObject({
      ok: false,
      error: { code: 'unavailable' },
    })
  })
})

describe('a recipient', () => {
  it.each([
    ['a list', 'engineer@osterby.example,thief@elsewhere.example'],
    ['a list by semicolon', 'engineer@osterby.example;thief@elsewhere.example'],
    ['a display name', 'engineer@osterby.example <thief@elsewhere.example>'],
    ['a quoted part', '"engineer@osterby.example,"@elsewhere.example'],
    ['a comment', 'thief(engineer@osterby.example)@elsewhere.example'],
    ['two signs', 'engineer@osterby.example@elsewhere.example'],
    ['a full-width sign', 'engineer＠osterby.example'],
    ['a full-width sign and a plain one', 'engineer＠osterby.example@elsewhere.example'],
    ['a line break', 'engineer@osterby.example\r\nBcc: thief@elsewhere.example'],
    ['a space', 'engineer@osterby.example thief@elsewhere.example'],
    ['an invisible character', 'engineer\u200b@osterby.example'],
    ['no domain', 'engineer@'],
    ['nothing', ''],
  ])('SE5: that is %s reaches nobody', async (_case, to) => {
    expect(await mailer().send({ ...mail, to })).toMatchObject({ ok: false, error: { code: 'rejected' } })
    expect(fake.messages()).toEqual([])
  })

  it('SE5: with an apostrophe and a plus is mailed byte for byte', async () => {
    await mailer().send({ ...mail, to: "o'neil+scans@osterby.example" })
    expect(fake.messages()[0]?.to).toEqual(["o'neil+scans@osterby.example"])
  })
})
