import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/authz/actor'
import type { Operation } from '@/lib/domain/operation'

import { addCompany, addPerson } from '../support/people'
import { openReportScene, type ReportScene } from '../support/report-scene'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { everyOperation } from './every-operation'
import { operationMatrix, type About } from './operation-matrix'

const operations = await everyOperation()
const about = (kind: About): Operation[] =>
  operations.filter(
    (operation): operation is Operation =>
      operation.kind === 'operation' && operationMatrix[operation.name] === kind,
  )

let portal: TestPortal
let scene: ReportScene
let strangers: readonly Actor[]
let administrator: Actor

beforeAll(async () => {
  portal = await openTestPortal()
  scene = await openReportScene(portal)
  const otherCompany = await addCompany(portal, 'Larkfield Rail Sensors')
  const foreign = [{ companyId: otherCompany, role: 'purchaser' as const }]
  const member = await addPerson(portal, {
    name: 'Before Terms',
    memberships: [{ companyId: scene.companyId, role: 'engineer' }],
  })
  administrator = await addPerson(portal, { name: 'Maren Holt', isAdministrator: true })
  strangers = [
    await addPerson(portal, { name: 'Iris Vane', memberships: foreign }),
    await addPerson(portal, { name: 'Una Berg', isConsultant: true }),
    { ...member, memberships: member.memberships.map((held) => ({ ...held, hasAcceptedTerms: false })) },
  ]
})

afterAll(() => portal.close())

const unknown = '0'.repeat(26)

describe('AZ1: every operation', () => {
  it('is in the matrix, and the matrix names nothing else', () => {
    const names = operations.map((operation) => operation.name).sort()
    expect(names).toEqual(Object.keys(operationMatrix).sort())
  })

  it.each(operations.map((operation) => [operation.name, operation] as const))(
    'AZ6: %s refuses a field that it does not name',
    (_name, operation) => {
      for (const field of ['clientId', 'isAdministrator', 'priceCents', 'status']) {
        const parsed = operation.schema.safeParse({ [field]: '1' })
        const codes = parsed.success ? [] : parsed.error.issues.map((issue) => issue.code)
        expect(codes, field).toContain('unrecognized_keys')
      }
    },
  )
})

describe('AZ2: an id of somebody else', () => {
  it.each(about('engagement').map((operation) => [operation.name, operation] as const))(
    '%s of an engagement answers as for an unknown one',
    async (_name, operation) => {
      for (const stranger of strangers) {
        const real = await operation.execute(portal.deps, stranger, { engagementId: scene.engagementId })
        const none = await operation.execute(portal.deps, stranger, { engagementId: unknown })
        expect(real).toEqual(none)
        expect(real).toMatchObject({ ok: false, error: { code: 'not_found' } })
      }
    },
  )

  it.each(about('company').map((operation) => [operation.name, operation] as const))(
    '%s of a company answers as for an unknown one',
    async (_name, operation) => {
      for (const stranger of strangers.slice(0, 2)) {
        const real = await operation.execute(portal.deps, stranger, { companyId: scene.companyId })
        const none = await operation.execute(portal.deps, stranger, { companyId: unknown })
        expect(real).toEqual(none)
        expect(real).toMatchObject({ ok: false, error: { code: 'not_found' } })
      }
    },
  )

  it.each(about('practice').map((operation) => [operation.name, operation] as const))(
    '%s is for the administrator alone',
    async (_name, operation) => {
      for (const person of [...strangers, scene.purchaser, scene.engineer, scene.author]) {
        const result = await operation.execute(portal.deps, person, {})
        expect(result).toMatchObject({ ok: false, error: { code: 'not_permitted' } })
      }
      const allowed = await operation.execute(portal.deps, administrator, {})
      expect(allowed.ok).toBe(true)
    },
  )
})

describe('the people of an engagement', () => {
  const clientsMay = [
    'engagements.getEngagement',
    'engagements.getHeading',
    'evidence.listEvidence',
    'findings.list',
    'hours.engagementTime',
    'reports.list',
  ]

  it.each(clientsMay)('may call %s', async (name) => {
    const operation = about('engagement').find((candidate) => candidate.name === name)
    for (const person of [scene.purchaser, scene.engineer, scene.author]) {
      const result = await operation?.execute(portal.deps, person, { engagementId: scene.engagementId })
      expect(result?.ok, person.name).toBe(true)
    }
  })
})
