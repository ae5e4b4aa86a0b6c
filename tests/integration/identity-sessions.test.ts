import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { disablePerson } from '@/lib/domain/identity/people.service'
import { closeSession, resolveSession, signOutEverywhere } from '@/lib/domain/identity/session.service'
import { signIn } from '@/lib/domain/identity/sign-in.service'

import { addCompany, addPerson } from '../support/people'
import { openTestPortal, type TestPortal } from '../support/test-portal'

const password = 'copper pour under the tie'
const minutes = 60_000
const hours = 60 * minutes

let portal: TestPortal

beforeEach(async () => {
  portal = await openTestPortal()
})

afterEach(() => portal.close())

async function signInAs(email: string): Promise<string> {
  const result = await signIn.execute(portal.deps, { email, password })
  if (!result.ok) throw new Error(result.error.message)
  return result.value.sessionSecret
}

const isOpen = async (secret: string) => (await resolveSession(portal.deps, secret)) !== null

describe('SE1: a session is checked at every request', () => {
  it('opens nothing after signing out, also when the old cookie is sent again', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const secret = await signInAs(person.email)
    expect(await isOpen(secret)).toBe(true)
    await closeSession(portal.deps, secret)
    expect(await isOpen(secret)).toBe(false)
  })

  it('ends on every device with "sign out everywhere"', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const [first, second] = [await signInAs(person.email), await signInAs(person.email)]
    await signOutEverywhere.execute(portal.deps, person, {})
    expect([await isOpen(first), await isOpen(second)]).toEqual([false, false])
  })

  it('ends when the person is shut out, and signing in again is refused', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const administrator = await addPerson(portal, { name: 'Ada Moor', isAdministrator: true })
    const secret = await signInAs(person.email)
    await disablePerson.execute(portal.deps, administrator, { personId: person.personId })
    expect(await isOpen(secret)).toBe(false)
    const again = await signIn.execute(portal.deps, { email: person.email, password })
    expect(again).toMatchObject({ error: { code: 'wrong_credentials' } })
  })

  it('is stored only as a hash', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const secret = await signInAs(person.email)
    const rows = await portal.db.selectFrom('session').selectAll().execute()
    expect(JSON.stringify(rows)).not.toContain(secret)
  })
})

describe('SE2: idle and absolute limits by the server clock', () => {
  it.each([
    { idle: 2 * hours - 1000, open: true },
    { idle: 2 * hours + 1000, open: false },
  ])('$idle ms without use: open is $open', async ({ idle, open }) => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const secret = await signInAs(person.email)
    portal.clock.advance(idle)
    expect(await isOpen(secret)).toBe(open)
  })

  it.each([
    { rest: -1000, open: true },
    { rest: 1000, open: false },
  ])('twelve hours and $rest ms in steady use: open is $open', async ({ rest, open }) => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const secret = await signInAs(person.email)
    for (let hour = 1; hour < 12; hour += 1) {
      portal.clock.advance(hours)
      expect(await isOpen(secret)).toBe(true)
    }
    portal.clock.advance(hours + rest)
    expect(await isOpen(secret)).toBe(open)
  })

  it('makes a new secret at every sign-in', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    expect(await signInAs(person.email)).not.toBe(await signInAs(person.email))
  })
})

describe('AZ7: a change of rights takes effect on the next request', () => {
  it('a membership that ends is gone from the same session', async () => {
    const companyId = await addCompany(portal, 'Osterby Pump Controls')
    const memberships = [{ companyId, role: 'engineer' as const }]
    const person = await addPerson(portal, { name: 'Noor Beck', password, memberships })
    const secret = await signInAs(person.email)
    expect((await resolveSession(portal.deps, secret))?.memberships).toHaveLength(1)
    await portal.db.updateTable('membership').set({ removed_at: portal.clock.now() }).execute()
    expect((await resolveSession(portal.deps, secret))?.memberships).toHaveLength(0)
  })

  it('a staff role that is taken away is gone from the same session', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password, isConsultant: true })
    const secret = await signInAs(person.email)
    expect((await resolveSession(portal.deps, secret))?.isConsultant).toBe(true)
    await portal.db.updateTable('person').set({ is_consultant: 0 }).execute()
    expect((await resolveSession(portal.deps, secret))?.isConsultant).toBe(false)
  })

  it('a new version of the terms takes the membership away until it is accepted', async () => {
    const companyId = await addCompany(portal, 'Osterby Pump Controls')
    const memberships = [{ companyId, role: 'engineer' as const }]
    const person = await addPerson(portal, { name: 'Noor Beck', password, memberships })
    const secret = await signInAs(person.email)
    const terms = { version: 1, title: 'Terms', body: 'Text', published_at: portal.clock.now() }
    await portal.db.insertInto('confidentiality_terms').values(terms).execute()
    const actor = await resolveSession(portal.deps, secret)
    expect(actor?.memberships).toMatchObject([{ hasAcceptedTerms: false }])
  })
})

describe('sign-in throttling', () => {
  it('refuses the right password after five failures for the account, until 15 minutes have passed', async () => {
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    for (let attempt = 0; attempt < 5; attempt += 1) {
      const wrong = await signIn.execute(portal.deps, { email: person.email, password: 'not this one' })
      expect(wrong).toMatchObject({ error: { code: 'wrong_credentials' } })
    }
    const right = await signIn.execute(portal.deps, { email: person.email, password })
    expect(right).toMatchObject({ error: { code: 'throttled' } })
    portal.clock.advance(15 * minutes)
    expect((await signIn.execute(portal.deps, { email: person.email, password })).ok).toBe(true)
  })

  it('counts unknown addresses like known ones, so that the answers tell nothing', async () => {
    const codes: string[] = []
    for (let attempt = 0; attempt < 6; attempt += 1) {
      const result = await signIn.execute(portal.deps, { email: 'nobody@test.example', password })
      codes.push(result.ok ? 'ok' : result.error.code)
    }
    expect(codes).toEqual([...Array<string>(5).fill('wrong_credentials'), 'throttled'])
  })

  it('refuses a network address after fifty failures over many accounts', async () => {
    for (let attempt = 0; attempt < 50; attempt += 1) {
      await signIn.execute(portal.deps, { email: `person${attempt}@test.example`, password })
    }
    const person = await addPerson(portal, { name: 'Noor Beck', password })
    const here = await signIn.execute(portal.deps, { email: person.email, password })
    expect(here).toMatchObject({ error: { code: 'throttled' } })
    const elsewhere = { ...portal.deps, request: { ...portal.deps.request, address: '198.51.100.7' } }
    expect((await signIn.execute(elsewhere, { email: person.email, password })).ok).toBe(true)
  })
})
