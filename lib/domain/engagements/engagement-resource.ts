import 'server-only'

import type { Db, Tx } from '@/db/client'
import { listClientsOn, listConsultantsOn } from '@/db/repositories/engagement-people.repo'
import { findEngagement, type EngagementRow } from '@/db/repositories/engagement.repo'
import { findScopeWithStatus } from '@/db/repositories/scope.repo'
import type { Actor } from '@/lib/authz/actor'
import { authorize, notFound, type Denial } from '@/lib/authz/authorize'
import type { Action } from '@/lib/authz/policy'
import type { EngagementResource } from '@/lib/authz/resource'
import { err, ok, type Result } from '@/lib/core/result'

export type LoadedEngagement = { readonly row: EngagementRow; readonly resource: EngagementResource }

/** The engagement with what the policy needs to know of it; undefined for an unknown id. */
export async function loadEngagementResource(
  db: Db | Tx,
  engagementId: string,
): Promise<LoadedEngagement | undefined> {
  const row = await findEngagement(db, engagementId)
  if (!row) return undefined
  const clients = await listClientsOn(db, engagementId)
  const consultants = await listConsultantsOn(db, engagementId)
  return {
    row,
    resource: {
      kind: 'engagement',
      companyId: row.company_id,
      clientPersonIds: clients.map((person) => person.personId),
      consultantPersonIds: consultants.map((person) => person.personId),
    },
  }
}

/** Loads the engagement and asks the policy: the first step of every operation on something in an engagement. */
export async function engagementFor(
  db: Db | Tx,
  actor: Actor,
  action: Action,
  engagementId: string,
): Promise<Result<LoadedEngagement, Denial>> {
  const loaded = await loadEngagementResource(db, engagementId)
  if (!loaded) return err(notFound)
  const allowed = authorize(actor, action, loaded.resource)
  return allowed.ok ? ok(loaded) : allowed
}

/** The hour cap of the scope in force, in minutes; null while none is approved. */
export async function approvedCapOf(db: Db | Tx, engagementId: string): Promise<number | null> {
  const approved = await findScopeWithStatus(db, engagementId, 'approved')
  return approved?.cap_minutes ?? null
}
