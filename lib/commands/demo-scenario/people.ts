import type { Tx } from '@/db/client'
import { insertAcceptance, insertTerms } from '@/db/repositories/confidentiality.repo'
import { insertCompany } from '@/db/repositories/company.repo'
import { insertPerson, upsertMembership } from '@/db/repositories/person.repo'
import type { CompanyRole } from '@/db/tables/identity'
import type { Deps } from '@/lib/domain/deps'

import { termsBody } from './terms'

/** The password of every demo account; the demo runs on this machine only. */
export const demoPassword = 'quiet loop small area'

type DemoPerson = {
  readonly key: string
  readonly name: string
  readonly email: string
  readonly isConsultant?: boolean
  readonly isAdministrator?: boolean
  readonly company?: { readonly key: 'osterby' | 'larkfield'; readonly role: CompanyRole }
}

/** Everybody in the invented scenario. None of them, and none of the companies, exists. */
export const demoPeople = [
  { key: 'administrator', name: 'Maren Holt', email: 'maren.holt@tarnhollow.example', isAdministrator: true },
  { key: 'consultant', name: 'Edda Quist', email: 'edda.quist@tarnhollow.example', isConsultant: true },
  { key: 'reviewer', name: 'Tobias Rehn', email: 'tobias.rehn@tarnhollow.example', isConsultant: true },
  {
    key: 'purchaser',
    name: 'Petra Lindqvist',
    email: 'petra.lindqvist@osterby.example',
    company: { key: 'osterby', role: 'purchaser' },
  },
  {
    key: 'engineer',
    name: 'Jonas Ekdahl',
    email: 'jonas.ekdahl@osterby.example',
    company: { key: 'osterby', role: 'engineer' },
  },
  {
    key: 'otherPurchaser',
    name: 'Iris Vane',
    email: 'iris.vane@larkfield.example',
    company: { key: 'larkfield', role: 'purchaser' },
  },
] as const satisfies readonly DemoPerson[]

export type DemoPersonKey = (typeof demoPeople)[number]['key']

export const demoCompanies = {
  osterby: 'Osterby Pump Controls',
  larkfield: 'Larkfield Rail Sensors',
} as const

export type DemoIds = {
  readonly people: Readonly<Record<DemoPersonKey, string>>
  readonly companies: Readonly<Record<keyof typeof demoCompanies, string>>
}

/** Stores the practice, its two clients, their people and their acceptance of the confidentiality terms. */
export async function seedPeople(tx: Tx, deps: Deps): Promise<DemoIds> {
  const now = deps.clock.now()
  const { newId } = deps.ids
  const companies = { osterby: newId(), larkfield: newId() }
  await insertCompany(tx, { id: companies.osterby, name: demoCompanies.osterby, created_at: now })
  await insertCompany(tx, { id: companies.larkfield, name: demoCompanies.larkfield, created_at: now })
  await insertTerms(tx, { version: 1, title: 'Confidentiality terms', body: termsBody, published_at: now })
  const passwordHash = await deps.passwords.hash(demoPassword)
  const people: Record<string, string> = {}
  for (const person of demoPeople as readonly DemoPerson[]) {
    const id = newId()
    people[person.key] = id
    await insertPerson(tx, {
      id,
      email: person.email,
      name: person.name,
      password_hash: passwordHash,
      is_consultant: person.isConsultant ? 1 : 0,
      is_administrator: person.isAdministrator ? 1 : 0,
      created_at: now,
      disabled_at: null,
    })
    if (person.company)
      await join(tx, deps, { ...person.company, id: companies[person.company.key] }, id, person.name)
  }
  return { companies, people: people as DemoIds['people'] }
}

async function join(
  tx: Tx,
  deps: Deps,
  company: { readonly id: string; readonly role: CompanyRole },
  personId: string,
  name: string,
): Promise<void> {
  const now = deps.clock.now()
  await upsertMembership(tx, {
    company_id: company.id,
    person_id: personId,
    role: company.role,
    created_at: now,
    removed_at: null,
  })
  await insertAcceptance(tx, {
    person_id: personId,
    company_id: company.id,
    version: 1,
    typed_name: name,
    network_address: '127.0.0.1',
    accepted_at: now,
  })
}
