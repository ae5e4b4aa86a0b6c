import type { CompanyRole } from '@/db/tables/identity'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'

import type { TestPortal } from './test-portal'

type NewPerson = {
  readonly name: string
  readonly isConsultant?: boolean
  readonly isAdministrator?: boolean
  readonly memberships?: readonly { readonly companyId: string; readonly role: CompanyRole }[]
  readonly password?: string
}

export async function addCompany(portal: TestPortal, name: string): Promise<string> {
  const id = portal.deps.ids.newId()
  await portal.db.insertInto('company').values({ id, name, created_at: portal.clock.now() }).execute()
  return id
}

export const emailOf = (name: string) => `${name.toLowerCase().replace(/[^a-z]+/g, '.')}@test.example`

/** Stores a person and returns them as the actor of a request. */
export async function addPerson(portal: TestPortal, person: NewPerson): Promise<Actor> {
  const personId = portal.deps.ids.newId()
  const email = emailOf(person.name)
  const passwordHash = person.password ? await portal.deps.passwords.hash(person.password) : null
  await withTx(portal.db, async (tx) => {
    await tx
      .insertInto('person')
      .values({
        id: personId,
        email,
        name: person.name,
        password_hash: passwordHash,
        is_consultant: person.isConsultant ? 1 : 0,
        is_administrator: person.isAdministrator ? 1 : 0,
        created_at: portal.clock.now(),
        disabled_at: null,
      })
      .execute()
    for (const membership of person.memberships ?? []) {
      await tx
        .insertInto('membership')
        .values({
          company_id: membership.companyId,
          person_id: personId,
          role: membership.role,
          created_at: portal.clock.now(),
          removed_at: null,
        })
        .execute()
    }
  })
  const memberships = (person.memberships ?? []).map((membership) => ({
    ...membership,
    companyName: 'Company of the test',
    hasAcceptedTerms: true,
  }))
  return {
    personId,
    name: person.name,
    email,
    isConsultant: person.isConsultant ?? false,
    isAdministrator: person.isAdministrator ?? false,
    memberships,
  }
}
