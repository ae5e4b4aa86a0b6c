import { err, ok, type Result } from '@/lib/core/result'

import type { Actor } from './actor'
import { policy, visibility, type Action } from './policy'
import { relationsOf, type Relation } from './relation'
import type { Resource } from './resource'

export type Denial =
  | { readonly code: 'not_found'; readonly message: string }
  | { readonly code: 'not_permitted'; readonly message: string }

export const notFound: Denial = {
  code: 'not_found',
  message: 'Nothing is here under this address. It may have been removed, or you may not be on it.',
}

const notPermitted: Denial = {
  code: 'not_permitted',
  message: 'Your role does not include this step. Ask the purchaser of your company or the practice.',
}

/** Whether the actor stands in one of the relations that allow the action. */
export function isAllowed(actor: Actor, action: Action, resource: Resource): boolean {
  return holdsOne(relationsOf(actor, resource), policy[action])
}

/**
 * The one gate of every operation: call it after loading the row and before anything else.
 * Somebody who may not know of the resource gets exactly the answer for an unknown id.
 */
export function authorize(actor: Actor, action: Action, resource: Resource): Result<true, Denial> {
  const held = relationsOf(actor, resource)
  if (holdsOne(held, policy[action])) return ok(true)
  return err(holdsOne(held, visibility[resource.kind]) ? notPermitted : notFound)
}

function holdsOne(held: ReadonlySet<Relation>, allowed: readonly Relation[]): boolean {
  return allowed.some((relation) => held.has(relation))
}
