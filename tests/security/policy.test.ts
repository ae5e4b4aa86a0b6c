import { describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/authz/actor'
import { authorize } from '@/lib/authz/authorize'
import { policy, type Action } from '@/lib/authz/policy'
import type { Resource } from '@/lib/authz/resource'

import { personas, policyMatrix, type Persona } from './policy-matrix'

const companyId = 'c'.repeat(26)
const otherCompanyId = 'd'.repeat(26)

function actorOf(persona: Persona): Actor {
  const member = (id: string, role: 'purchaser' | 'engineer', hasAcceptedTerms = true) => [
    { companyId: id, companyName: 'Company', role, hasAcceptedTerms },
  ]
  const memberships = {
    purchaser: member(companyId, 'purchaser'),
    'engineer on it': member(companyId, 'engineer'),
    'engineer not on it': member(companyId, 'engineer'),
    'member before the terms': member(companyId, 'engineer', false),
    'consultant on it': [],
    'consultant not on it': [],
    administrator: [],
    'purchaser of another company': member(otherCompanyId, 'purchaser'),
  }[persona]
  return {
    personId: persona,
    name: persona,
    email: `${persona}@test.example`,
    isConsultant: persona.startsWith('consultant'),
    isAdministrator: persona === 'administrator',
    memberships,
  }
}

function resourceOf(about: (typeof policyMatrix)[Action]['about'], persona: Persona): Resource {
  switch (about) {
    case 'practice':
      return { kind: 'practice' }
    case 'oneself':
      return { kind: 'person', personId: persona }
    case 'company':
      return { kind: 'company', companyId }
    case 'engagement':
      return {
        kind: 'engagement',
        companyId,
        // A member who has not accepted the terms gains nothing from being put on an engagement.
        clientPersonIds: ['engineer on it', 'member before the terms'],
        consultantPersonIds: ['consultant on it'],
      }
  }
}

const actions = Object.keys(policy) as Action[]
const cases = actions.flatMap((action) =>
  personas.map((persona) => ({ action, persona, may: policyMatrix[action].may.includes(persona) })),
)

describe('AZ1: the policy', () => {
  it('has a row in the matrix for every action, and none besides', () => {
    expect(Object.keys(policyMatrix).sort()).toEqual([...actions].sort())
  })

  it.each(cases)('$action by $persona: $may', ({ action, persona, may }) => {
    const resource = resourceOf(policyMatrix[action].about, persona)
    expect(authorize(actorOf(persona), action, resource).ok).toBe(may)
  })
})

describe('AZ2: a refusal', () => {
  const strangers: Persona[] = ['consultant not on it', 'purchaser of another company', 'engineer not on it']

  it.each(actions.filter((action) => policyMatrix[action].about === 'engagement'))(
    '%s of an engagement one is not on answers as for an unknown id',
    (action) => {
      for (const stranger of strangers) {
        const resource = resourceOf('engagement', stranger)
        expect(authorize(actorOf(stranger), action, resource)).toMatchObject({ error: { code: 'not_found' } })
      }
    },
  )

  it('of a step that one’s role does not include says so, because the row is no secret', () => {
    const decision = authorize(
      actorOf('engineer on it'),
      'scope.decide',
      resourceOf('engagement', 'engineer on it'),
    )
    expect(decision).toMatchObject({ error: { code: 'not_permitted' } })
  })
})
