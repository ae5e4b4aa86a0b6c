import type { Actor } from '@/lib/authz/actor'
import type { Deps } from '@/lib/domain/deps'
import { listMembershipsOf } from '@/db/repositories/person.repo'
import type { Operation } from '@/lib/domain/operation'

import { demoPeople, type DemoIds, type DemoPersonKey } from './people'

/** Acts as the people of the scenario, through the operations that their pages use. */
export class DemoScene {
  readonly deps: Deps
  readonly ids: DemoIds

  constructor(deps: Deps, ids: DemoIds) {
    this.deps = deps
    this.ids = ids
  }

  async as<Value>(key: DemoPersonKey, operation: Operation<Value>, input: unknown): Promise<Value> {
    const result = await operation.execute(this.deps, await this.#actor(key), input)
    if (result.ok) return result.value
    const fields = JSON.stringify(result.error.fields ?? {})
    throw new Error(`The demo scenario stopped at ${operation.name}: ${result.error.message} ${fields}`)
  }

  async #actor(key: DemoPersonKey): Promise<Actor> {
    const person = demoPeople.find((candidate) => candidate.key === key)
    if (!person) throw new Error(`Nobody in the scenario is ${key}`)
    const personId = this.ids.people[key]
    const memberships = await listMembershipsOf(this.deps.db, personId)
    return {
      personId,
      name: person.name,
      email: person.email,
      isConsultant: 'isConsultant' in person,
      isAdministrator: 'isAdministrator' in person,
      memberships: memberships.map(({ acceptedVersion, ...membership }) => ({
        ...membership,
        hasAcceptedTerms: acceptedVersion !== null,
      })),
    }
  }
}
