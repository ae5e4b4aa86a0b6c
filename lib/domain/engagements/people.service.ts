import 'server-only'

import {
  listConsultantsOn,
  putClientOn,
  putConsultantOn,
  takeClientOff,
  takeConsultantOff,
} from '@/db/repositories/engagement-people.repo'
import { listConsultants as listAllConsultants, listPeopleOfCompany } from '@/db/repositories/person.repo'
import { withTx } from '@/db/tx'
import { err, ok } from '@/lib/core/result'

import { operation } from '../operation'
import { engagementFor } from './engagement-resource'
import { notAColleague, notAConsultant } from './engagements.errors'
import { engagementIdSchema, personOnEngagementSchema } from './engagements.schema'

/** Puts a colleague of the client company on the engagement. */
export const addClient = operation(
  'engagements.addClient',
  personOnEngagementSchema,
  async (deps, actor, input) =>
    withTx(deps.db, async (tx) => {
      const engagement = await engagementFor(tx, actor, 'engagement.addClient', input.engagementId)
      if (!engagement.ok) return engagement
      const colleagues = await listPeopleOfCompany(tx, engagement.value.row.company_id)
      if (!colleagues.some((colleague) => colleague.personId === input.personId)) return err(notAColleague)
      await putClientOn(tx, { ...input, at: deps.clock.now() })
      return ok(null)
    }),
)

/** Takes a colleague off the engagement; what they did on it stays. */
export const removeClient = operation(
  'engagements.removeClient',
  personOnEngagementSchema,
  async (deps, actor, input) =>
    withTx(deps.db, async (tx) => {
      const engagement = await engagementFor(tx, actor, 'engagement.addClient', input.engagementId)
      if (!engagement.ok) return engagement
      await takeClientOff(tx, { ...input, at: deps.clock.now() })
      return ok(null)
    }),
)

/** Lets a consultant of the practice work on the engagement. */
export const assignConsultant = operation(
  'engagements.assignConsultant',
  personOnEngagementSchema,
  async (deps, actor, input) =>
    withTx(deps.db, async (tx) => {
      const engagement = await engagementFor(tx, actor, 'engagement.assign', input.engagementId)
      if (!engagement.ok) return engagement
      const consultants = await listAllConsultants(tx)
      if (!consultants.some((consultant) => consultant.personId === input.personId)) {
        return err(notAConsultant)
      }
      await putConsultantOn(tx, { ...input, at: deps.clock.now() })
      return ok(null)
    }),
)

/** Takes a consultant off the engagement: it is out of their reach with their next request. */
export const releaseConsultant = operation(
  'engagements.releaseConsultant',
  personOnEngagementSchema,
  async (deps, actor, input) =>
    withTx(deps.db, async (tx) => {
      const engagement = await engagementFor(tx, actor, 'engagement.assign', input.engagementId)
      if (!engagement.ok) return engagement
      await takeConsultantOff(tx, { ...input, at: deps.clock.now() })
      return ok(null)
    }),
)

/** The practice's consultants, and which of them work on this engagement. */
export const listConsultants = operation(
  'engagements.listConsultants',
  engagementIdSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'engagement.assign', input.engagementId)
    if (!engagement.ok) return engagement
    const assigned = await listConsultantsOn(deps.db, input.engagementId)
    const consultants = await listAllConsultants(deps.db)
    return ok(
      consultants.map((consultant) => ({
        ...consultant,
        isAssigned: assigned.some((held) => held.personId === consultant.personId),
      })),
    )
  },
)
