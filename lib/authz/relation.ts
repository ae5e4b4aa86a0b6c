import type { Actor } from './actor'
import type { Resource } from './resource'

/** How an actor stands to a resource. */
export type Relation =
  | 'self'
  | 'signed_in'
  | 'consultant'
  | 'administrator'
  | 'pending_member'
  | 'purchaser'
  | 'engineer'
  | 'engaged_engineer'
  | 'assigned_consultant'

/** All relations that hold between the actor and the resource. */
export function relationsOf(actor: Actor, resource: Resource): ReadonlySet<Relation> {
  const relations = new Set<Relation>(['signed_in'])
  if (actor.isConsultant) relations.add('consultant')
  if (actor.isAdministrator) relations.add('administrator')
  if (resource.kind === 'person' && resource.personId === actor.personId) relations.add('self')
  if (resource.kind === 'company' || resource.kind === 'engagement') {
    const held = actor.memberships.find((membership) => membership.companyId === resource.companyId)
    if (held && !held.hasAcceptedTerms) relations.add('pending_member')
    const membership = held?.hasAcceptedTerms ? held : undefined
    if (membership) relations.add(membership.role)
    if (resource.kind === 'engagement') {
      const isEngaged = resource.clientPersonIds.includes(actor.personId)
      if (membership && isEngaged) relations.add('engaged_engineer')
      const isAssigned = resource.consultantPersonIds.includes(actor.personId)
      if (actor.isConsultant && isAssigned) relations.add('assigned_consultant')
    }
  }
  return relations
}
