import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { mailSchema, type Mail } from '@/lib/domain/mail'
import { inviteColleague, inviteCompany } from '@/lib/domain/identity/invitation.service'
import {
  askForInvitationLink,
  askForPasswordReset,
  readInvitation,
  setPassword,
} from '@/lib/domain/identity/one-time-link.service'
import { resolveSession } from '@/lib/domain/identity/session.service'
import { signIn } from '@/lib/domain/identity/sign-in.service'

import { addCompany, addPerson, emailOf } from '../support/people'
import { openTestPortal, type TestPortal } from '../support/test-portal'

const password = 'copper pour under the tie'
const minutes = 60_000

let portal: TestPortal

beforeEach(async () => {
  portal = await openTestPortal()
})

afterEach(() => portal.close())

async function mailsTo(recipient: string): Promise<Mail[]> {
  const rows = await portal.db
    .selectFrom('outbox_message')
    .select('payload')
    .where('recipient', '=', recipient)
    .orderBy('created_at')
    .execute()
  return rows.map((row) => mailSchema.parse(JSON.parse(row.payload)))
}

async function lastTokenTo(recipient: string): Promise<string> {
  const mail = (await mailsTo(recipient)).findLast((sent) => 'link' in sent)
  if (!mail || !('link' in mail)) throw new Error(`Nothing with a link went to ${recipient}`)
  return mail.link.split('/').at(-1) ?? ''
}

async function inviteOsterby() {
  const administrator = await addPerson(portal, { name: 'Ada Moor', isAdministrator: true })
  const result = await inviteCompany.execute(portal.deps, administrator, {
    companyName: 'Osterby Pump Controls',
    email: 'Petra.Lind@Osterby.example',
  })
  if (!result.ok) throw new Error(result.error.message)
  return { administrator, companyId: result.value.companyId }
}

async function resetTokenFor(name: string) {
  const person = await addPerson(portal, { name, password })
  await askForPasswordReset.execute(portal.deps, { email: person.email })
  return { person, token: await lastTokenTo(person.email) }
}

describe('invitation of a company', () => {
  it('leads from the invitation through a mailed link to a person who can sign in', async () => {
    const { companyId } = await inviteOsterby()
    const invitation = await lastTokenTo('petra.lind@osterby.example')
    const read = await readInvitation.execute(portal.deps, { token: invitation })
    expect(read).toMatchObject({
      ok: true,
      value: { companyName: 'Osterby Pump Controls', role: 'purchaser' },
    })
    await askForInvitationLink.execute(portal.deps, { token: invitation })
    const token = await lastTokenTo('petra.lind@osterby.example')
    expect(token).not.toBe(invitation)
    const set = await setPassword.execute(portal.deps, { token, name: 'Petra Lind', password })
    expect(set.ok).toBe(true)
    const signedIn = await signIn.execute(portal.deps, { email: 'petra.lind@osterby.example', password })
    if (!signedIn.ok) throw new Error(signedIn.error.message)
    const actor = await resolveSession(portal.deps, signedIn.value.sessionSecret)
    expect(actor?.memberships).toMatchObject([{ companyId, role: 'purchaser' }])
  })

  it('is used up once a person has come of it', async () => {
    await inviteOsterby()
    const invitation = await lastTokenTo('petra.lind@osterby.example')
    await askForInvitationLink.execute(portal.deps, { token: invitation })
    const token = await lastTokenTo('petra.lind@osterby.example')
    await setPassword.execute(portal.deps, { token, name: 'Petra Lind', password })
    expect(await readInvitation.execute(portal.deps, { token: invitation })).toMatchObject({
      error: { code: 'link_not_usable' },
    })
  })

  it('lapses after seven days', async () => {
    await inviteOsterby()
    const invitation = await lastTokenTo('petra.lind@osterby.example')
    portal.clock.advance(7 * 24 * 60 * minutes - 1)
    expect((await readInvitation.execute(portal.deps, { token: invitation })).ok).toBe(true)
    portal.clock.advance(1)
    expect((await readInvitation.execute(portal.deps, { token: invitation })).ok).toBe(false)
  })

  it('refuses a company of the same name and a colleague who belongs to it already', async () => {
    const { administrator } = await inviteOsterby()
    const again = await inviteCompany.execute(portal.deps, administrator, {
      companyName: 'Osterby Pump Controls',
      email: 'other@osterby.example',
    })
    expect(again).toMatchObject({ error: { code: 'company_exists' } })
    const companyId = await addCompany(portal, 'Larkfield Rail Sensors')
    const memberships = [{ companyId, role: 'purchaser' as const }]
    const purchaser = await addPerson(portal, { name: 'Iris Vane', memberships })
    const known = await inviteColleague.execute(portal.deps, purchaser, {
      companyId,
      email: purchaser.email,
      role: 'engineer',
    })
    expect(known).toMatchObject({ error: { code: 'already_a_member' } })
  })
})

describe('SE4: a mailed link', () => {
  it('works once: of two uses at the same time one wins', async () => {
    const { token } = await resetTokenFor('Noor Beck')
    const uses = await Promise.all(
      [1, 2].map(() => setPassword.execute(portal.deps, { token, password: 'another long password' })),
    )
    expect(uses.filter((use) => use.ok)).toHaveLength(1)
  })

  it.each([
    { after: 10 * minutes - 1, ok: true },
    { after: 10 * minutes + 1000, ok: false },
  ])('at $after ms after it was asked for: $ok', async ({ after, ok }) => {
    const { token } = await resetTokenFor('Noor Beck')
    portal.clock.advance(after)
    const use = await setPassword.execute(portal.deps, { token, password: 'another long password' })
    expect(use.ok).toBe(ok)
  })

  it('opens nothing in a browser that did not ask for it', async () => {
    const { token } = await resetTokenFor('Noor Beck')
    const elsewhere = {
      ...portal.deps,
      request: { ...portal.deps.request, browserSecret: 'browser-of-somebody-else' },
    }
    const use = await setPassword.execute(elsewhere, { token, password: 'another long password' })
    expect(use).toMatchObject({ error: { code: 'link_not_usable' } })
  })

  it('carries 256 random bits and is stored only as a hash', async () => {
    const { token } = await resetTokenFor('Noor Beck')
    expect(Buffer.from(token, 'base64url')).toHaveLength(32)
    const links = await portal.db.selectFrom('one_time_link').selectAll().execute()
    expect(JSON.stringify(links)).not.toContain(token)
  })

  it('is mailed three times in 15 minutes at most, also for twenty asks in a minute', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    for (let ask = 0; ask < 20; ask += 1) {
      await askForPasswordReset.execute(portal.deps, { email: person.email })
    }
    expect(await mailsTo(person.email)).toHaveLength(3)
  })

  it('gets the same answer for an unknown address, which is sent nothing', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const known = await askForPasswordReset.execute(portal.deps, { email: person.email })
    const unknown = await askForPasswordReset.execute(portal.deps, { email: 'nobody@test.example' })
    expect(known).toEqual({ ok: true, value: { email: person.email } })
    expect(unknown).toEqual({ ok: true, value: { email: 'nobody@test.example' } })
    expect(await mailsTo('nobody@test.example')).toHaveLength(0)
  })

  it('ends every earlier session when the password is set', async () => {
    const { person, token } = await resetTokenFor('Noor Beck')
    const signedIn = await signIn.execute(portal.deps, { email: person.email, password })
    if (!signedIn.ok) throw new Error(signedIn.error.message)
    await setPassword.execute(portal.deps, { token, password: 'another long password' })
    expect(await resolveSession(portal.deps, signedIn.value.sessionSecret)).toBeNull()
  })
})

describe('SE5: the address mailed is the stored one', () => {
  it.each([
    'noor.beck@test.example,eve@evil.example',
    '"noor.beck@test.example"@evil.example',
    'noor.beck＠test.example',
    'noor.beck@test.example\r\nBcc: eve@evil.example',
    'noor.beck@test.example eve@evil.example',
    'Noor <eve@evil.example>',
    'noor.beck@evil.example@test.example',
    'noor.beck@tëst.example',
    'ｎoor.beck@test.example',
  ])('%j is refused and nothing is sent', async (attack) => {
    await addPerson(portal, { name: 'Noor Beck', password })
    const result = await askForPasswordReset.execute(portal.deps, { email: attack })
    expect(result).toMatchObject({ error: { code: 'invalid_input' } })
    const sent = await portal.db.selectFrom('outbox_message').selectAll().execute()
    expect(sent).toHaveLength(0)
  })

  it('capital letters reach the stored spelling, byte for byte', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    await askForPasswordReset.execute(portal.deps, { email: 'NOOR.Beck@Test.Example' })
    const [row] = await portal.db.selectFrom('outbox_message').select('recipient').execute()
    expect(row?.recipient).toBe(person.email)
    expect(person.email).toBe(emailOf('Noor Beck'))
  })
})
