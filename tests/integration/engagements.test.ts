import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/authz/actor'
import { approvedCapOf } from '@/lib/domain/engagements/engagement-resource'
import {
  getEngagement,
  getHeading,
  listEngagements,
  openEngagement,
} from '@/lib/domain/engagements/engagement.service'
import {
  addClient,
  assignConsultant,
  listConsultants,
  releaseConsultant,
  removeClient,
} from '@/lib/domain/engagements/people.service'
import { approveScope, declineScope, proposeScope, saveScope } from '@/lib/domain/engagements/scope.service'
import { mailSchema } from '@/lib/domain/mail'

import { aBrief, approveTestScope, openTestEngagement, type TestEngagement } from '../support/engagement'
import { addPerson } from '../support/people'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

let portal: TestPortal
let osterby: TestEngagement

beforeEach(async () => {
  portal = await openTestPortal()
  osterby = await openTestEngagement(portal)
})

afterEach(() => portal.close())

const read = (actor: Actor) =>
  getEngagement.execute(portal.deps, actor, { engagementId: osterby.engagementId })

async function savedScope(capHours = '10') {
  const { engagementId, consultant } = osterby
  const input = { engagementId, body: 'Find the ring and damp it.', capHours }
  return valueOf(await saveScope.execute(portal.deps, consultant, input))
}

describe('a brief', () => {
  it('is kept in SI and shown to those on the engagement, its opener among them', async () => {
    const engagement = valueOf(await read(osterby.engineer))
    expect(engagement.brief).toMatchObject({
      vinVolts: 48,
      voutVolts: 12,
      ioutAmperes: 2.5,
      switchingHertz: 420e3,
      oscillators: [{ name: 'Processor clock', hertz: 25e6, tolerancePpm: 50 }],
    })
    expect(engagement.clients.map((client) => client.personId)).toEqual([osterby.engineer.personId])
    expect(engagement).toMatchObject({ status: 'briefed', number: 1, companyName: 'Osterby Pump Controls' })
  })

  it('leaves an electrical value that is not known empty, and drops empty rows of oscillators', async () => {
    const { companyId, engineer } = osterby
    const brief = {
      ...aBrief,
      companyId,
      vin: '',
      iout: ' ',
      oscillators: [{ name: '', frequency: '', tolerancePpm: '' }],
    }
    const { engagementId } = valueOf(await openEngagement.execute(portal.deps, engineer, brief))
    const opened = valueOf(await getEngagement.execute(portal.deps, engineer, { engagementId }))
    expect(opened.brief).toMatchObject({ vinVolts: null, ioutAmperes: null, oscillators: [] })
  })

  it.each([
    [{ switchingFrequency: '0' }, 'switchingFrequency'],
    [{ switchingFrequency: '420 V' }, 'switchingFrequency'],
    [{ vin: 'about 48' }, 'vin'],
    [{ goalTestDate: '2027-02-30' }, 'goalTestDate'],
    [{ title: '  ' }, 'title'],
    [{ oscillators: [{ name: 'X', frequency: '', tolerancePpm: '5' }] }, 'oscillators.0.frequency'],
    [
      {
        oscillators: [
          { name: '', frequency: '' },
          { name: 'X', frequency: 'fast', tolerancePpm: '5' },
        ],
      },
      'oscillators.1.frequency',
    ],
  ])('with %j gets its sentence at %s', async (change, field) => {
    const { companyId, engineer } = osterby
    const refused = await openEngagement.execute(portal.deps, engineer, { ...aBrief, companyId, ...change })
    expect(refused).toMatchObject({
      ok: false,
      error: { code: 'invalid_input', fields: { [field]: expect.any(String) } },
    })
  })

  it.each(['status', 'number', 'openedBy', 'price'])(
    'AZ6: with an extra field %s is refused',
    async (field) => {
      const { companyId, engineer } = osterby
      const refused = await openEngagement.execute(portal.deps, engineer, {
        ...aBrief,
        companyId,
        [field]: 1,
      })
      expect(refused).toMatchObject({ error: { code: 'invalid_input' } })
    },
  )

  it('numbers engagements one after another, also when two are opened at once', async () => {
    const { companyId, engineer } = osterby
    const opened = await Promise.all(
      [1, 2, 3].map(() => openEngagement.execute(portal.deps, engineer, { ...aBrief, companyId })),
    )
    expect(opened.map((result) => valueOf(result).number).sort()).toEqual([2, 3, 4])
  })
})

describe('who may see what', () => {
  it('AZ3: lists hold the engagements that the reader may know of, and no others', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const listed = async (actor: Actor) =>
      valueOf(await listEngagements.execute(portal.deps, actor, {})).map((heading) => heading.number)
    expect(await listed(osterby.purchaser)).toEqual([osterby.number])
    expect(await listed(osterby.engineer)).toEqual([osterby.number])
    expect(await listed(osterby.consultant)).toEqual([osterby.number])
    expect(await listed(larkfield.engineer)).toEqual([larkfield.number])
    expect(await listed(osterby.administrator)).toEqual([larkfield.number, osterby.number])
    const elsewhere = { companyId: osterby.companyId, role: 'engineer' as const }
    const idle = await addPerson(portal, { name: 'Idle Engineer', memberships: [elsewhere] })
    expect(await listed(idle)).toEqual([])
  })

  it('AZ2: a foreign engagement answers every step exactly as an unknown one', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const { scopeId } = await savedScope()
    const unknownId = portal.deps.ids.newId()
    const personId = larkfield.engineer.personId
    for (const actor of [larkfield.purchaser, larkfield.engineer, larkfield.consultant]) {
      const answers = async (engagementId: string, scope: string) =>
        Promise.all([
          getEngagement.execute(portal.deps, actor, { engagementId }),
          getHeading.execute(portal.deps, actor, { engagementId }),
          addClient.execute(portal.deps, actor, { engagementId, personId }),
          removeClient.execute(portal.deps, actor, { engagementId, personId }),
          assignConsultant.execute(portal.deps, actor, { engagementId, personId }),
          releaseConsultant.execute(portal.deps, actor, { engagementId, personId }),
          listConsultants.execute(portal.deps, actor, { engagementId }),
          saveScope.execute(portal.deps, actor, { engagementId, body: 'x', capHours: '1' }),
          proposeScope.execute(portal.deps, actor, { scopeId: scope }),
          approveScope.execute(portal.deps, actor, { scopeId: scope }),
          declineScope.execute(portal.deps, actor, { scopeId: scope, note: 'no' }),
        ])
      const foreign = await answers(osterby.engagementId, scopeId)
      expect(foreign).toEqual(await answers(unknownId, unknownId))
      expect(foreign.every((answer) => !answer.ok && answer.error.code === 'not_found')).toBe(true)
    }
    const brief = { ...aBrief, companyId: osterby.companyId }
    const opened = await openEngagement.execute(portal.deps, larkfield.purchaser, brief)
    expect(opened).toMatchObject({ error: { code: 'not_found' } })
  })

  it('AZ4: an administrator reads the heading and nothing of the brief', async () => {
    const { administrator, engagementId } = osterby
    const heading = valueOf(await getHeading.execute(portal.deps, administrator, { engagementId }))
    expect(JSON.stringify(heading)).not.toContain(aBrief.symptom)
    expect(heading.may).toMatchObject({ read: false, assign: true, addEvidence: false })
    expect(await read(administrator)).toMatchObject({ error: { code: 'not_permitted' } })
  })

  it('AZ7: an engineer or consultant who is taken off is out with the next request', async () => {
    const { engagementId, engineer, consultant, purchaser, administrator } = osterby
    valueOf(await removeClient.execute(portal.deps, purchaser, { engagementId, personId: engineer.personId }))
    valueOf(
      await releaseConsultant.execute(portal.deps, administrator, {
        engagementId,
        personId: consultant.personId,
      }),
    )
    expect(await read(engineer)).toMatchObject({ error: { code: 'not_found' } })
    expect(await read(consultant)).toMatchObject({ error: { code: 'not_found' } })
    valueOf(await addClient.execute(portal.deps, purchaser, { engagementId, personId: engineer.personId }))
    expect((await read(engineer)).ok).toBe(true)
  })

  it('puts only people of the company and consultants of the practice on an engagement', async () => {
    const { engagementId, purchaser, administrator } = osterby
    const stranger = await addPerson(portal, { name: 'Some Stranger' })
    const person = { engagementId, personId: stranger.personId }
    expect(await addClient.execute(portal.deps, purchaser, person)).toMatchObject({
      error: { code: 'not_a_colleague' },
    })
    expect(await assignConsultant.execute(portal.deps, administrator, person)).toMatchObject({
      error: { code: 'not_a_consultant' },
    })
  })

  it('offers the purchaser the colleagues who are not on it yet', async () => {
    const engagement = valueOf(await read(osterby.purchaser))
    expect(engagement.addableClients.map((person) => person.personId)).toEqual([osterby.purchaser.personId])
    expect(valueOf(await read(osterby.engineer)).addableClients).toEqual([])
  })
})

describe('a scope', () => {
  it('moves the engagement from briefed over scoped to active and sets the cap', async () => {
    const { engagementId, consultant, purchaser } = osterby
    const { scopeId } = await savedScope('12:30')
    expect(valueOf(await read(purchaser)).status).toBe('briefed')
    valueOf(await proposeScope.execute(portal.deps, consultant, { scopeId }))
    expect(valueOf(await read(purchaser)).status).toBe('scoped')
    expect(await approvedCapOf(portal.db, engagementId)).toBeNull()
    valueOf(await approveScope.execute(portal.deps, purchaser, { scopeId }))
    expect(valueOf(await read(purchaser)).status).toBe('active')
    expect(await approvedCapOf(portal.db, engagementId)).toBe(750)
  })

  it('is mailed to every purchaser when it is proposed, and to nobody before', async () => {
    const companyId = osterby.companyId
    const memberships = [{ companyId, role: 'purchaser' as const }]
    const second = await addPerson(portal, { name: 'Second Purchaser', memberships })
    const { scopeId } = await savedScope()
    expect(await portal.db.selectFrom('outbox_message').selectAll().execute()).toHaveLength(0)
    valueOf(await proposeScope.execute(portal.deps, osterby.consultant, { scopeId }))
    const rows = await portal.db.selectFrom('outbox_message').selectAll().execute()
    expect(rows.map((row) => row.recipient).sort()).toEqual([osterby.purchaser.email, second.email].sort())
    expect(mailSchema.parse(JSON.parse(rows[0]?.payload ?? ''))).toMatchObject({
      kind: 'scope_proposed',
      capMinutes: 600,
      link: `http://localhost:3000/engagements/${osterby.engagementId}`,
    })
  })

  it('AZ4: stays the consultants’ own while it is a draft', async () => {
    const { scopeId } = await savedScope()
    expect(valueOf(await read(osterby.consultant)).scopes).toHaveLength(1)
    expect(valueOf(await read(osterby.purchaser)).scopes).toEqual([])
    expect(await approveScope.execute(portal.deps, osterby.purchaser, { scopeId })).toMatchObject({
      error: { code: 'not_found' },
    })
  })

  it('that is changed is a new version, and approving it supersedes the one in force', async () => {
    await approveTestScope(portal, osterby, '10')
    await approveTestScope(portal, osterby, '16')
    const { scopes } = valueOf(await read(osterby.purchaser))
    expect(scopes.map(({ version, status, capMinutes }) => [version, status, capMinutes])).toEqual([
      [2, 'approved', 960],
      [1, 'superseded', 600],
    ])
    expect(await approvedCapOf(portal.db, osterby.engagementId)).toBe(960)
  })

  it('keeps the version in force when a change is declined, with the note', async () => {
    await approveTestScope(portal, osterby, '10')
    const { scopeId } = await savedScope('40')
    valueOf(await proposeScope.execute(portal.deps, osterby.consultant, { scopeId }))
    const note = 'Not this quarter'
    valueOf(await declineScope.execute(portal.deps, osterby.purchaser, { scopeId, note }))
    expect(await approvedCapOf(portal.db, osterby.engagementId)).toBe(600)
    expect(valueOf(await read(osterby.consultant)).scopes[0]).toMatchObject({
      status: 'declined',
      decisionNote: note,
    })
  })

  it('BZ2: is decided once, and only after it was proposed and only while no newer one waits', async () => {
    const { consultant, purchaser } = osterby
    const first = await savedScope('5')
    valueOf(await proposeScope.execute(portal.deps, consultant, idOf(first)))
    const second = await savedScope('6')
    valueOf(await proposeScope.execute(portal.deps, consultant, idOf(second)))
    const refused = { error: { code: 'scope_not_open' } }
    expect(await approveScope.execute(portal.deps, purchaser, idOf(first))).toMatchObject(refused)
    valueOf(await approveScope.execute(portal.deps, purchaser, idOf(second)))
    expect(await approveScope.execute(portal.deps, purchaser, idOf(second))).toMatchObject(refused)
    expect(await declineScope.execute(portal.deps, purchaser, { ...idOf(second), note: 'no' })).toMatchObject(
      refused,
    )
    expect(await proposeScope.execute(portal.deps, consultant, idOf(second))).toMatchObject({
      error: { code: 'scope_not_saved' },
    })
  })

  it('DB3: of two decisions at the same time one counts', async () => {
    const { scopeId } = await savedScope()
    valueOf(await proposeScope.execute(portal.deps, osterby.consultant, { scopeId }))
    const decisions = await Promise.all([
      approveScope.execute(portal.deps, osterby.purchaser, { scopeId }),
      declineScope.execute(portal.deps, osterby.purchaser, { scopeId, note: 'no' }),
    ])
    expect(decisions.filter((decision) => decision.ok)).toHaveLength(1)
  })

  it('is written by the consultant and decided by the purchaser, not the other way round', async () => {
    const { engagementId, engineer, purchaser, consultant } = osterby
    const { scopeId } = await savedScope()
    valueOf(await proposeScope.execute(portal.deps, consultant, { scopeId }))
    const refused = { error: { code: 'not_permitted' } }
    const draft = { engagementId, body: 'Ours', capHours: '1' }
    expect(await saveScope.execute(portal.deps, purchaser, draft)).toMatchObject(refused)
    expect(await approveScope.execute(portal.deps, engineer, { scopeId })).toMatchObject(refused)
    expect(await approveScope.execute(portal.deps, consultant, { scopeId })).toMatchObject(refused)
  })

  it.each(['0', '', 'ten', '-3', '7:75', '10001', '1e3'])('does not take %j for a cap', async (capHours) => {
    const { engagementId, consultant } = osterby
    const refused = await saveScope.execute(portal.deps, consultant, { engagementId, body: 'x', capHours })
    expect(refused).toMatchObject({ error: { code: 'invalid_input' } })
  })
})

const idOf = ({ scopeId }: { readonly scopeId: string }) => ({ scopeId })
