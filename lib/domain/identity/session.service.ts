import 'server-only'

import { findPerson, listMembershipsOf } from '@/db/repositories/person.repo'
import { findCurrentTerms } from '@/db/repositories/confidentiality.repo'
import { endSession, endSessionsOf, findSession, touchSession } from '@/db/repositories/session.repo'
import type { Actor } from '@/lib/authz/actor'
import { authorize } from '@/lib/authz/authorize'
import { ok } from '@/lib/core/result'

import type { Deps } from '../deps'
import { noInput } from '../form-fields'
import { operation } from '../operation'
import { identityLimits } from './limits'
import { hashSecret } from './secret-hash'

const touchInterval = 60_000

/**
 * The person behind a session secret with today's roles and memberships, read afresh so that a change takes effect on
 * the next request; null when the session ended, idled out, grew too old, or the person was disabled.
 */
export async function resolveSession(
  deps: Pick<Deps, 'db' | 'clock'>,
  sessionSecret: string,
): Promise<Actor | null> {
  const now = deps.clock.now()
  const idHash = hashSecret(sessionSecret)
  const session = await findSession(deps.db, idHash)
  if (!session || session.ended_at !== null) return null
  if (now - session.created_at >= identityLimits.sessionAbsolute) return null
  if (now - session.last_seen_at >= identityLimits.sessionIdle) return null
  const person = await findPerson(deps.db, session.person_id)
  if (!person || person.disabled_at !== null) return null
  if (now - session.last_seen_at >= touchInterval) await touchSession(deps.db, idHash, now)
  return {
    personId: person.id,
    name: person.name,
    email: person.email,
    isConsultant: person.is_consultant === 1,
    isAdministrator: person.is_administrator === 1,
    memberships: await currentMemberships(deps, person.id),
  }
}

async function currentMemberships(deps: Pick<Deps, 'db'>, personId: string): Promise<Actor['memberships']> {
  const [rows, terms] = await Promise.all([listMembershipsOf(deps.db, personId), findCurrentTerms(deps.db)])
  return rows.map(({ acceptedVersion, ...membership }) => ({
    ...membership,
    hasAcceptedTerms: terms === undefined || acceptedVersion === terms.version,
  }))
}

/** Ends one session; its cookie opens nothing afterwards. */
export async function closeSession(deps: Pick<Deps, 'db' | 'clock'>, sessionSecret: string): Promise<void> {
  await endSession(deps.db, hashSecret(sessionSecret), deps.clock.now())
}

/** "Sign out everywhere": ends every session of the person, the present one included. */
export const signOutEverywhere = operation('identity.signOutEverywhere', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'person.endSessions', { kind: 'person', personId: actor.personId })
  if (!allowed.ok) return allowed
  await endSessionsOf(deps.db, actor.personId, deps.clock.now())
  return ok(null)
})
