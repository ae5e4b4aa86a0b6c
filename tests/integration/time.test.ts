import { sql } from 'kysely'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/authz/actor'
import { assignConsultant } from '@/lib/domain/engagements/people.service'
import { engagementTime, postTime } from '@/lib/domain/hours/posting.service'
import { addTime, discardTime, editTime } from '@/lib/domain/hours/time-draft.service'
import { myTimer, startTimer, stopTimer } from '@/lib/domain/hours/timer.service'

import { approveTestScope, openTestEngagement, type TestEngagement } from '../support/engagement'
import { creditTestBlock, dayLength, draftTime, foldOf, storedLedger } from '../support/hours'
import { addPerson } from '../support/people'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

const minute = 60_000
const hour = 60 * minute

let portal: TestPortal
let osterby: TestEngagement

beforeEach(async () => {
  portal = await openTestPortal()
  osterby = await openTestEngagement(portal)
})

afterEach(() => portal.close())

const work = { workKind: 'measurement', text: 'Measured the switch node' }

const start = (actor: Actor, engagementId = osterby.engagementId) =>
  startTimer.execute(portal.deps, actor, { engagementId, ...work })

const stop = (actor: Actor) => stopTimer.execute(portal.deps, actor, {})

const timeOf = async (actor: Actor) =>
  valueOf(await engagementTime.execute(portal.deps, actor, { engagementId: osterby.engagementId }))

const post = (timeEntryId: string, actor = osterby.consultant) =>
  postTime.execute(portal.deps, actor, { timeEntryId })

const add = (
  entry: { readonly startedAt: string; readonly workedMinutes: string },
  actor = osterby.consultant,
) => addTime.execute(portal.deps, actor, { engagementId: osterby.engagementId, ...work, ...entry })

async function anotherConsultant(): Promise<Actor> {
  const other = await addPerson(portal, { name: 'Rune Falk', isConsultant: true })
  const { engagementId, administrator } = osterby
  valueOf(
    await assignConsultant.execute(portal.deps, administrator, { engagementId, personId: other.personId }),
  )
  return other
}

describe('the timer', () => {
  it('runs from its start until it is stopped, also across a reload, and leaves a draft', async () => {
    valueOf(await start(osterby.consultant))
    portal.clock.advance(25 * minute + 1000)
    const running = valueOf(await myTimer.execute(portal.deps, osterby.consultant, {}))
    expect(running).toMatchObject({ engagementId: osterby.engagementId, text: work.text })
    expect((running?.now ?? 0) - (running?.startedAt ?? 0)).toBe(25 * minute + 1000)
    valueOf(await stop(osterby.consultant))
    expect(valueOf(await myTimer.execute(portal.deps, osterby.consultant, {}))).toBeNull()
    expect((await timeOf(osterby.consultant)).drafts).toMatchObject([
      { ...work, workedSeconds: 25 * 60 + 1, minutes: 30 },
    ])
  })

  it('leaves a draft that can be corrected at once, though its seconds are typed as whole minutes', async () => {
    portal.clock.advance(1_700)
    valueOf(await start(osterby.consultant))
    portal.clock.advance(10_900)
    const { timeEntryId } = valueOf(await stop(osterby.consultant))
    const change = { timeEntryId, ...work, startedAt: '2026-12-01T09:00', workedMinutes: '1' }
    expect((await editTime.execute(portal.deps, osterby.consultant, change)).ok).toBe(true)
  })

  it('started right after another was stopped does not overlap with it', async () => {
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, osterby.companyId)
    for (let round = 0; round < 2; round += 1) {
      valueOf(await start(osterby.consultant))
      portal.clock.advance(10_900)
      const { timeEntryId } = valueOf(await stop(osterby.consultant))
      expect((await post(timeEntryId)).ok).toBe(true)
    }
  })

  it('is one for each person: a second start is refused and names the running one', async () => {
    valueOf(await start(osterby.consultant))
    expect(await start(osterby.consultant)).toMatchObject({
      error: { code: 'timer_running', message: expect.stringContaining('Buck converter rings') },
    })
    expect((await start(await anotherConsultant())).ok).toBe(true)
  })

  it('stopped in two tabs at once leaves one draft', async () => {
    valueOf(await start(osterby.consultant))
    portal.clock.advance(hour)
    const stops = await Promise.all([stop(osterby.consultant), stop(osterby.consultant)])
    expect(stops.filter((result) => result.ok)).toHaveLength(1)
    expect(stops.find((result) => !result.ok)).toMatchObject({ error: { code: 'no_timer' } })
    expect((await timeOf(osterby.consultant)).drafts).toHaveLength(1)
  })

  it.each([
    ['at once', 0, 1],
    ['after 24 h', 24 * hour, 86_400],
    ['after a weekend', 60 * hour, 86_400],
    ['by a clock that was set back', -hour, 1],
  ])('BZ4: stopped %s keeps between a second and 24 hours', async (_case, after, seconds) => {
    valueOf(await start(osterby.consultant))
    portal.clock.advance(after)
    valueOf(await stop(osterby.consultant))
    const rows = await portal.db.selectFrom('time_entry').select('worked_seconds').execute()
    expect(rows).toEqual([{ worked_seconds: seconds }])
  })

  it('is for assigned consultants: to others the engagement is unknown or not theirs to time', async () => {
    const stranger = await addPerson(portal, { name: 'Sten Ohm', isConsultant: true })
    expect(await start(stranger)).toMatchObject({ error: { code: 'not_found' } })
    for (const actor of [osterby.purchaser, osterby.engineer, osterby.administrator]) {
      expect(await start(actor)).toMatchObject({ error: { code: 'not_permitted' } })
    }
  })
})

describe('BZ4: time that is entered by hand', () => {
  it.each([
    ['zero', { startedAt: '2026-11-30T09:00', workedMinutes: '0' }, 'workedMinutes'],
    ['negative', { startedAt: '2026-11-30T09:00', workedMinutes: '-5' }, 'workedMinutes'],
    ['a fraction', { startedAt: '2026-11-30T09:00', workedMinutes: '1.5' }, 'workedMinutes'],
    ['an exponent', { startedAt: '2026-11-30T09:00', workedMinutes: '1e2' }, 'workedMinutes'],
    ['more than 24 hours', { startedAt: '2026-11-28T09:00', workedMinutes: '1441' }, 'workedMinutes'],
    ['nothing', { startedAt: '2026-11-30T09:00', workedMinutes: '' }, 'workedMinutes'],
    ['a day that the calendar lacks', { startedAt: '2026-11-31T09:00', workedMinutes: '5' }, 'startedAt'],
    ['no time', { startedAt: '', workedMinutes: '5' }, 'startedAt'],
    ['an end in the future', { startedAt: '2026-12-01T08:00', workedMinutes: '61' }, 'startedAt'],
  ])('%s is refused at its field', async (_case, entry, field) => {
    const refused = await add(entry)
    expect(refused).toMatchObject({ ok: false, error: { fields: { [field]: expect.any(String) } } })
    expect(await portal.db.selectFrom('time_entry').select('id').execute()).toEqual([])
  })

  it.each([
    ['that ends now', { startedAt: '2026-12-01T08:00', workedMinutes: '60' }, '2026-12-01T08:00Z'],
    ['of 24 hours', { startedAt: '2026-11-29T09:00', workedMinutes: '1440' }, '2026-11-29T09:00Z'],
    ['over the end of a month', { startedAt: '2026-10-31T23:30', workedMinutes: '60' }, '2026-10-31T23:30Z'],
    [
      'in the night the clocks go back',
      { startedAt: '2026-10-25T00:30', workedMinutes: '120' },
      '2026-10-25T00:30Z',
    ],
    [
      'in the night the clocks go on',
      { startedAt: '2026-03-29T00:30', workedMinutes: '120' },
      '2026-03-29T00:30Z',
    ],
  ])('%s counts every minute once', async (_case, entry, startedAt) => {
    valueOf(await add(entry))
    expect((await timeOf(osterby.consultant)).drafts).toMatchObject([
      { startedAt: Date.parse(startedAt), workedSeconds: Number(entry.workedMinutes) * 60 },
    ])
  })

  it.each([
    ['ends where the other begins', '2026-11-30T08:00', '60', true],
    ['begins where the other ends', '2026-11-30T10:00', '60', true],
    ['reaches a minute into it', '2026-11-30T08:00', '61', false],
    ['begins in its last minute', '2026-11-30T09:59', '1', false],
    ['lies within it', '2026-11-30T09:15', '10', false],
    ['covers it', '2026-11-30T08:00', '240', false],
  ])('that %s: accepted is %s %s %s', async (_case, startedAt, workedMinutes, isAccepted) => {
    valueOf(await add({ startedAt: '2026-11-30T09:00', workedMinutes: '60' }))
    const second = await add({ startedAt, workedMinutes })
    expect(second.ok).toBe(isAccepted)
    if (!second.ok) {
      expect(second.error).toMatchObject({
        code: 'overlaps',
        message: expect.stringContaining('2026-11-30 09:00 to 2026-11-30 10:00 UTC'),
      })
    }
  })

  it('of two people may overlap', async () => {
    const entry = { startedAt: '2026-11-30T09:00', workedMinutes: '60' }
    valueOf(await add(entry))
    expect((await add(entry, await anotherConsultant())).ok).toBe(true)
  })

  it('AZ6: takes named fields only', async () => {
    const entry = {
      engagementId: osterby.engagementId,
      ...work,
      startedAt: '2026-11-30T09:00',
      workedMinutes: '60',
    }
    for (const extra of [
      { personId: osterby.purchaser.personId },
      { postedMinutes: '1' },
      { minutes: '1' },
    ]) {
      expect(await addTime.execute(portal.deps, osterby.consultant, { ...entry, ...extra })).toMatchObject({
        error: { code: 'invalid_input' },
      })
    }
  })
})

describe('a draft', () => {
  it('is changed and thrown away by its owner alone; to others it is unknown', async () => {
    const draft = await draftTime(portal, osterby, 30)
    const other = await anotherConsultant()
    const change = { timeEntryId: draft, ...work, startedAt: '2026-11-20T09:00', workedMinutes: '31' }
    for (const actor of [other, osterby.purchaser, osterby.administrator]) {
      const unknown = { error: { code: 'not_found' } }
      expect(await editTime.execute(portal.deps, actor, change)).toMatchObject(unknown)
      expect(await discardTime.execute(portal.deps, actor, { timeEntryId: draft })).toMatchObject(unknown)
      expect(await post(draft, actor)).toMatchObject(unknown)
    }
    valueOf(await editTime.execute(portal.deps, osterby.consultant, change))
    expect((await timeOf(osterby.consultant)).drafts).toMatchObject([
      { text: work.text, workedSeconds: 31 * 60, minutes: 36 },
    ])
    valueOf(await discardTime.execute(portal.deps, osterby.consultant, { timeEntryId: draft }))
    expect((await timeOf(osterby.consultant)).drafts).toEqual([])
  })

  it('AZ4: is seen by its owner only, in no answer to a client, a colleague or the administrator', async () => {
    await draftTime(portal, osterby, 30)
    const readers = [osterby.purchaser, osterby.engineer, osterby.administrator, await anotherConsultant()]
    for (const reader of readers) {
      expect(JSON.stringify(await timeOf(reader))).not.toContain('Fitted the ring')
    }
    expect((await timeOf(osterby.consultant)).drafts).toHaveLength(1)
  })

  it('does not count against cap or balance', async () => {
    await approveTestScope(portal, osterby, '1')
    await creditTestBlock(portal, osterby.companyId)
    await draftTime(portal, osterby, 600)
    expect(await timeOf(osterby.purchaser)).toMatchObject({
      postedMinutes: 0,
      capMinutes: 60,
      spendableMinutes: 600,
    })
  })
})

describe('posting', () => {
  it('rounds up to six minutes, tells so before, and shows it to client and consultant', async () => {
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, osterby.companyId)
    const draft = await draftTime(portal, osterby, 31)
    expect((await timeOf(osterby.consultant)).drafts).toMatchObject([{ minutes: 36 }])
    expect(valueOf(await post(draft))).toEqual({ minutes: 36 })
    for (const reader of [osterby.purchaser, osterby.engineer, osterby.consultant, osterby.administrator]) {
      expect(await timeOf(reader)).toMatchObject({
        postedMinutes: 36,
        posted: [{ by: osterby.consultant.name, minutes: 36, text: 'Fitted the ring' }],
      })
    }
  })

  it('needs an approved scope', async () => {
    await creditTestBlock(portal, osterby.companyId)
    expect(await post(await draftTime(portal, osterby, 6))).toMatchObject({ error: { code: 'no_scope' } })
  })

  it('may reach the cap exactly; one minute more is refused and says what to do', async () => {
    await approveTestScope(portal, osterby, '1')
    await creditTestBlock(portal, osterby.companyId)
    valueOf(await post(await draftTime(portal, osterby, 30, { daysAgo: 1 })))
    const tooMuch = await draftTime(portal, osterby, 31, { daysAgo: 2 })
    expect(await post(tooMuch)).toMatchObject({
      error: { code: 'cap_exceeded', message: expect.stringMatching(/36 min.*30 min are left.*higher cap/) },
    })
    expect(foldOf(await storedLedger(portal, osterby.companyId))).toBe(570)
    valueOf(await post(await draftTime(portal, osterby, 30, { daysAgo: 3 })))
    expect(await timeOf(osterby.consultant)).toMatchObject({ postedMinutes: 60, capMinutes: 60 })
    expect(await post(await draftTime(portal, osterby, 1, { daysAgo: 4 }))).toMatchObject({
      error: { code: 'cap_exceeded' },
    })
  })

  it.each([
    ['0:35', false],
    ['0:36', true],
  ])('BZ4: of 36 min under a cap of %s: posted is %s', async (capHours, isPosted) => {
    await approveTestScope(portal, osterby, capHours)
    await creditTestBlock(portal, osterby.companyId)
    expect((await post(await draftTime(portal, osterby, 31))).ok).toBe(isPosted)
  })

  it('goes on under a higher cap once that is approved', async () => {
    await approveTestScope(portal, osterby, '0.5')
    await creditTestBlock(portal, osterby.companyId)
    const draft = await draftTime(portal, osterby, 60)
    expect(await post(draft)).toMatchObject({ error: { code: 'cap_exceeded' } })
    await approveTestScope(portal, osterby, '1')
    expect((await post(draft)).ok).toBe(true)
  })

  it('twice is refused, and posted time takes no change, not even by SQL', async () => {
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, osterby.companyId)
    const draft = await draftTime(portal, osterby, 30)
    valueOf(await post(draft))
    const posted = { error: { code: 'already_posted', message: expect.stringContaining('reversal') } }
    const change = { timeEntryId: draft, ...work, startedAt: '2026-11-20T09:00', workedMinutes: '6' }
    expect(await post(draft)).toMatchObject(posted)
    expect(await editTime.execute(portal.deps, osterby.consultant, change)).toMatchObject(posted)
    expect(await discardTime.execute(portal.deps, osterby.consultant, { timeEntryId: draft })).toMatchObject(
      posted,
    )
    await expect(sql`update time_entry set posted_minutes = 6`.execute(portal.db)).rejects.toThrow(
      'never edited',
    )
    await expect(sql`delete from time_entry`.execute(portal.db)).rejects.toThrow('never deleted')
    expect(foldOf(await storedLedger(portal, osterby.companyId))).toBe(570)
  })

  it('of a timed draft that overlaps posted time is refused until the draft is changed', async () => {
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, osterby.companyId)
    valueOf(await start(osterby.consultant))
    portal.clock.advance(2 * hour)
    const byHand = await add({ startedAt: '2026-12-01T10:00', workedMinutes: '30' })
    valueOf(await post(valueOf(byHand).timeEntryId))
    const { timeEntryId } = valueOf(await stop(osterby.consultant))
    expect(await post(timeEntryId)).toMatchObject({ error: { code: 'overlaps' } })
    const change = { timeEntryId, ...work, startedAt: '2026-12-01T09:00', workedMinutes: '60' }
    valueOf(await editTime.execute(portal.deps, osterby.consultant, change))
    expect((await post(timeEntryId)).ok).toBe(true)
  })

  it('AZ7: ends with the assignment, while the posted time stays', async () => {
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, osterby.companyId)
    valueOf(await post(await draftTime(portal, osterby, 6, { daysAgo: 1 })))
    const draft = await draftTime(portal, osterby, 6, { daysAgo: 2 })
    await portal.db.updateTable('engagement_consultant').set({ removed_at: portal.clock.now() }).execute()
    expect(await post(draft)).toMatchObject({ error: { code: 'not_found' } })
    expect((await timeOf(osterby.purchaser)).posted).toHaveLength(1)
  })

  it('debits only the company of the engagement', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, larkfield.companyId, { validUntil: portal.clock.now() + 100 * dayLength })
    expect(await post(await draftTime(portal, osterby, 6))).toMatchObject({
      error: { code: 'insufficient_hours' },
    })
    expect(foldOf(await storedLedger(portal, larkfield.companyId))).toBe(600)
  })
})
