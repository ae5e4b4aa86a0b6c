import 'server-only'

import { findBrief, listKnownOscillators } from '@/db/repositories/engagement-brief.repo'
import { listClientsOn, listConsultantsOn } from '@/db/repositories/engagement-people.repo'
import { listEngagementsWithin } from '@/db/repositories/engagement.repo'
import { findPerson, listPeopleOfCompany } from '@/db/repositories/person.repo'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { authorize } from '@/lib/authz/authorize'
import { ok } from '@/lib/core/result'

import { noInput } from '../form-fields'
import { operation } from '../operation'
import { briefOf, headingOf, stepsOf } from './engagement-dto'
import { engagementFor } from './engagement-resource'
import { engagementIdSchema, openEngagementSchema } from './engagements.schema'
import { storeEngagement } from './store-engagement'
import { scopesFor } from './scope-dto'

/** Begins an engagement with the client's brief; whoever opens it is on it. */
export const openEngagement = operation(
  'engagements.openEngagement',
  openEngagementSchema,
  async (deps, actor, input) => {
    const company = { kind: 'company', companyId: input.companyId } as const
    const allowed = authorize(actor, 'engagement.open', company)
    if (!allowed.ok) return allowed
    return ok(await withTx(deps.db, (tx) => storeEngagement(tx, deps, actor, input)))
  },
)

/** The engagements that the reader may know of, newest first; an administrator sees the headings of all. */
export const listEngagements = operation('engagements.listEngagements', noInput, async (deps, actor) => {
  const rows = await listEngagementsWithin(deps.db, reachOf(actor))
  return ok(rows.map(headingOf))
})

/** Title, company and status, with the steps that are open to the reader. */
export const getHeading = operation(
  'engagements.getHeading',
  engagementIdSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'engagement.readHeading', input.engagementId)
    if (!engagement.ok) return engagement
    const { row, resource } = engagement.value
    return ok({ ...headingOf(row), may: stepsOf(actor, resource) })
  },
)

/** The whole engagement for those who work on it: brief, people, scope. Drafts of a scope are the consultants'. */
export const getEngagement = operation(
  'engagements.getEngagement',
  engagementIdSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'engagement.read', input.engagementId)
    if (!engagement.ok) return engagement
    const { row, resource } = engagement.value
    const may = stepsOf(actor, resource)
    const [brief, oscillators, clients, consultants, opener, scopes] = await Promise.all([
      findBrief(deps.db, row.id),
      listKnownOscillators(deps.db, row.id),
      listClientsOn(deps.db, row.id),
      listConsultantsOn(deps.db, row.id),
      findPerson(deps.db, row.opened_by),
      scopesFor(deps.db, row.id, may.writeScope),
    ])
    if (!brief || !opener) throw new Error('An engagement without its brief or opener')
    const colleagues = may.addClient ? await listPeopleOfCompany(deps.db, row.company_id) : []
    const addable = colleagues.filter(({ personId }) =>
      clients.every((client) => client.personId !== personId),
    )
    return ok({
      ...headingOf(row),
      may,
      openedBy: opener.name,
      openedAt: row.created_at,
      brief: briefOf(brief, oscillators),
      clients,
      consultants,
      addableClients: addable.map(({ personId, name }) => ({ personId, name })),
      scopes,
    })
  },
)

function reachOf(actor: Actor) {
  const memberships = actor.memberships.filter((membership) => membership.hasAcceptedTerms)
  const companiesAs = (role: 'purchaser' | 'engineer') =>
    memberships.filter((membership) => membership.role === role).map((membership) => membership.companyId)
  return {
    all: actor.isAdministrator,
    companyIds: companiesAs('purchaser'),
    onCompanyIds: companiesAs('engineer'),
    clientPersonId: actor.personId,
    consultantPersonId: actor.isConsultant ? actor.personId : null,
  }
}
