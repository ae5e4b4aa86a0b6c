import 'server-only'

import { listCompanies } from '@/db/repositories/company.repo'
import { listOpenInvitations } from '@/db/repositories/invitation.repo'
import { findPerson, listPeople, listPeopleOfCompany, setDisabledAt } from '@/db/repositories/person.repo'
import { endSessionsOf } from '@/db/repositories/session.repo'
import { withTx } from '@/db/tx'
import { authorize, notFound } from '@/lib/authz/authorize'
import { practice } from '@/lib/authz/resource'
import { err, ok } from '@/lib/core/result'

import { noInput } from '../form-fields'
import { operation } from '../operation'
import type { IdentityError } from './identity.errors'
import { companyIdSchema, personIdSchema } from './identity.schema'

/** Client companies with their people, and the invitations that nobody has taken up yet. */
export const listClients = operation('identity.listClients', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'company.list', practice)
  if (!allowed.ok) return allowed
  const [companies, invitations] = await Promise.all([
    listCompanies(deps.db),
    listOpenInvitations(deps.db, deps.clock.now()),
  ])
  const clients = await Promise.all(
    companies.map(async (company) => ({
      companyId: company.id,
      name: company.name,
      people: await listPeopleOfCompany(deps.db, company.id),
      invited: invitations
        .filter((invitation) => invitation.company_id === company.id)
        .map(({ email, role, expires_at }) => ({ email, role, expiresAt: expires_at })),
    })),
  )
  return ok(clients)
})

/** Everybody who works for the practice. */
export const listStaff = operation('identity.listStaff', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'person.list', practice)
  if (!allowed.ok) return allowed
  const people = await listPeople(deps.db)
  return ok(
    people
      .filter((person) => person.is_consultant === 1 || person.is_administrator === 1)
      .map((person) => ({
        personId: person.id,
        name: person.name,
        email: person.email,
        isConsultant: person.is_consultant === 1,
        isAdministrator: person.is_administrator === 1,
        isDisabled: person.disabled_at !== null,
      })),
  )
})

/** The people of one company, as its members see them. */
export const listColleagues = operation(
  'identity.listColleagues',
  companyIdSchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'company.read', { kind: 'company', companyId: input.companyId })
    if (!allowed.ok) return allowed
    return ok(await listPeopleOfCompany(deps.db, input.companyId))
  },
)

/** Shuts a person out: sessions end now, sign-in is refused. Their past work stays. */
export const disablePerson = operation(
  'identity.disablePerson',
  personIdSchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'person.disable', { kind: 'person', personId: input.personId })
    if (!allowed.ok) return allowed
    return withTx(deps.db, async (tx) => {
      const person = await findPerson(tx, input.personId)
      if (!person) return err(notFound)
      if (person.id === actor.personId) return err(cannotDisableOneself)
      const now = deps.clock.now()
      await setDisabledAt(tx, person.id, now)
      await endSessionsOf(tx, person.id, now)
      return ok(null)
    })
  },
)

const cannotDisableOneself: IdentityError = {
  code: 'last_administrator',
  message: 'Nobody can shut out their own account. Ask another administrator to do it.',
}
