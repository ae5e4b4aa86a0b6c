import fc from 'fast-check'
import { sql } from 'kysely'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { companyHours } from '@/lib/domain/hours/balance.service'
import { postTime } from '@/lib/domain/hours/posting.service'

import { approveTestScope, openTestEngagement, type TestEngagement } from '../support/engagement'
import { creditTestBlock, dayLength, draftTime, foldOf, storedLedger } from '../support/hours'
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

const post = (timeEntryId: string) => postTime.execute(portal.deps, osterby.consultant, { timeEntryId })

const hours = async (actor = osterby.purchaser) =>
  valueOf(await companyHours.execute(portal.deps, actor, { companyId: osterby.companyId }))

describe('the hours of a company', () => {
  it('show blocks with what is left of them, and every movement, newest first, with the balance after it', async () => {
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, osterby.companyId, { minutes: 600, title: 'Ten hours' })
    portal.clock.advance(dayLength)
    valueOf(await post(await draftTime(portal, osterby, 85)))
    const shown = await hours()
    expect(shown).toMatchObject({ balanceMinutes: 510, spendableMinutes: 510 })
    expect(shown.blocks).toMatchObject([
      { title: 'Ten hours', minutes: 600, remaining: 510, isExpired: false },
    ])
    expect(shown.movements).toMatchObject([
      {
        kind: 'debit',
        minutes: -90,
        balance: 510,
        engagement: 'Buck converter rings',
        text: 'Fitted the ring',
      },
      { kind: 'credit', minutes: 600, balance: 600, engagement: null },
    ])
  })

  it('of a company that never bought any are empty, not an error', async () => {
    expect(await hours()).toMatchObject({ balanceMinutes: 0, spendableMinutes: 0, blocks: [], movements: [] })
  })

  it('count hours whose validity ended in the balance but not in what can be spent', async () => {
    const now = portal.clock.now()
    await creditTestBlock(portal, osterby.companyId, { minutes: 60, validUntil: now + dayLength })
    await creditTestBlock(portal, osterby.companyId, { minutes: 30, validUntil: now + 2 * dayLength })
    portal.clock.advance(dayLength)
    const shown = await hours()
    expect(shown).toMatchObject({ balanceMinutes: 90, spendableMinutes: 30 })
    expect(shown.blocks.map((block) => block.isExpired).sort()).toEqual([false, true])
  })

  it('AZ2: of another company answer as those of an unknown one', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const outsider = await addPerson(portal, { name: 'Cora', isConsultant: true })
    const ask = (companyId: string, actor = larkfield.purchaser) =>
      companyHours.execute(portal.deps, actor, { companyId })
    const foreign = await ask(osterby.companyId)
    expect(foreign).toEqual(await ask('0'.repeat(26)))
    expect(foreign).toMatchObject({ error: { code: 'not_found' } })
    expect(await ask(osterby.companyId, outsider)).toEqual(foreign)
    expect((await ask(osterby.companyId, osterby.administrator)).ok).toBe(true)
  })
})

describe('BZ1: the hour ledger', () => {
  it('takes no change and no deletion, not even by SQL', async () => {
    await creditTestBlock(portal, osterby.companyId)
    const edit = sql`update hour_ledger_entry set minutes = minutes + 1`.execute(portal.db)
    await expect(edit).rejects.toThrow('ledger entries are never edited')
    const drop = sql`delete from hour_ledger_entry`.execute(portal.db)
    await expect(drop).rejects.toThrow('ledger entries are never deleted')
    expect(foldOf(await storedLedger(portal, osterby.companyId))).toBe(600)
  })

  it('takes no entry that would draw a block below zero, not even by SQL', async () => {
    await creditTestBlock(portal, osterby.companyId, { minutes: 60 })
    const insert = sql`
      insert into hour_ledger_entry (id, company_id, block_id, kind, minutes, source_kind, source_id, text, created_at)
      select ${portal.deps.ids.newId()}, company_id, id, 'debit', -61, 'test', 'x', 'too much', 0 from hour_block`
    await expect(insert.execute(portal.db)).rejects.toThrow('a block is never overdrawn')
  })

  it('is credited once for one purchase', async () => {
    await creditTestBlock(portal, osterby.companyId)
    const [block] = await portal.db.selectFrom('hour_block').selectAll().execute()
    if (!block) throw new Error('No block')
    const again = portal.db.insertInto('hour_block').values({ ...block, id: portal.deps.ids.newId() })
    await expect(again.execute()).rejects.toThrow('UNIQUE')
  })

  it('splits a debit over blocks, the oldest first, and passes those by that have expired', async () => {
    await approveTestScope(portal, osterby)
    const now = portal.clock.now()
    const expired = await creditTestBlock(portal, osterby.companyId, {
      minutes: 60,
      validFrom: now - 3 * dayLength,
      validUntil: now,
    })
    const newer = await creditTestBlock(portal, osterby.companyId, {
      minutes: 60,
      validFrom: now - dayLength,
    })
    const older = await creditTestBlock(portal, osterby.companyId, {
      minutes: 18,
      validFrom: now - 2 * dayLength,
    })
    valueOf(await post(await draftTime(portal, osterby, 30)))
    const debits = await portal.db
      .selectFrom('hour_ledger_entry')
      .innerJoin('hour_block', 'hour_block.id', 'hour_ledger_entry.block_id')
      .where('kind', '=', 'debit')
      .select(['hour_block.source_id', 'hour_ledger_entry.minutes'])
      .execute()
    const bySource = new Map(debits.map((debit) => [debit.source_id, debit.minutes]))
    expect(bySource).toEqual(
      new Map([
        [older, -18],
        [newer, -12],
      ]),
    )
    expect(bySource.has(expired)).toBe(false)
  })

  it('refuses what valid blocks do not cover, says what there is, and leaves all as it was', async () => {
    await approveTestScope(portal, osterby)
    const now = portal.clock.now()
    await creditTestBlock(portal, osterby.companyId, { minutes: 600, validUntil: now + 1 })
    await creditTestBlock(portal, osterby.companyId, { minutes: 54 })
    portal.clock.advance(1)
    const draft = await draftTime(portal, osterby, 60)
    const before = await storedLedger(portal, osterby.companyId)
    const refused = await post(draft)
    expect(refused).toMatchObject({
      error: { code: 'insufficient_hours', message: expect.stringMatching(/54 min.*1 h.*buy hours/) },
    })
    expect(await storedLedger(portal, osterby.companyId)).toEqual(before)
  })
})

describe('DB3: postings at the same time', () => {
  it.each([2, 50])('%d of them never overdraw: what fits is posted, the rest is refused', async (count) => {
    await approveTestScope(portal, osterby, '1000')
    const fitting = Math.ceil(count / 5)
    await creditTestBlock(portal, osterby.companyId, { minutes: fitting * 6 })
    const drafts: string[] = []
    for (let index = 1; index <= count; index += 1) {
      drafts.push(await draftTime(portal, osterby, 6, { daysAgo: index }))
    }
    const results = await Promise.all(drafts.map(post))
    expect(results.filter((result) => result.ok)).toHaveLength(fitting)
    const refusals = results.flatMap((result) => (result.ok ? [] : [result.error.code]))
    expect(new Set(refusals)).toEqual(new Set(['insufficient_hours']))
    expect(foldOf(await storedLedger(portal, osterby.companyId))).toBe(0)
  })

  it('of one draft debit it once', async () => {
    await approveTestScope(portal, osterby)
    await creditTestBlock(portal, osterby.companyId, { minutes: 600 })
    const draft = await draftTime(portal, osterby, 60)
    const results = await Promise.all(Array.from({ length: 50 }, () => post(draft)))
    expect(results.filter((result) => result.ok)).toHaveLength(1)
    const codes = new Set(results.flatMap((result) => (result.ok ? [] : [result.error.code])))
    expect(codes).toEqual(new Set(['already_posted']))
    expect(foldOf(await storedLedger(portal, osterby.companyId))).toBe(540)
  })
})

describe('BZ1: any interleaving of credits and postings', () => {
  const step = fc.oneof(
    fc.record({
      kind: fc.constant('credit' as const),
      minutes: fc.integer({ min: 1, max: 120 }),
      validDays: fc.integer({ min: 1, max: 20 }),
    }),
    fc.record({ kind: fc.constant('post' as const), minutes: fc.integer({ min: 1, max: 90 }) }),
    fc.record({ kind: fc.constant('wait' as const), days: fc.integer({ min: 1, max: 8 }) }),
  )

  it('leaves balance = fold ≥ 0, in all and for every block, and nothing taken from an expired block', async () => {
    await approveTestScope(portal, osterby, '9999')
    let daysAgo = 400
    await fc.assert(
      fc.asyncProperty(fc.array(fc.array(step, { maxLength: 4 }), { maxLength: 5 }), async (rounds) => {
        for (const round of rounds) {
          for (const { days } of round.filter((one) => one.kind === 'wait'))
            portal.clock.advance(days * dayLength)
          const drafts: string[] = []
          for (const { minutes } of round.filter((one) => one.kind === 'post')) {
            daysAgo += 1
            drafts.push(await draftTime(portal, osterby, minutes, { daysAgo }))
          }
          const spendable = (await hours()).spendableMinutes
          const credits = round.filter((one) => one.kind === 'credit')
          const [posted] = await Promise.all([
            Promise.all(drafts.map(post)),
            ...credits.map(({ minutes, validDays }) =>
              creditTestBlock(portal, osterby.companyId, {
                minutes,
                validUntil: portal.clock.now() + validDays * dayLength,
              }),
            ),
          ])
          const ledger = await storedLedger(portal, osterby.companyId)
          const shown = await hours()
          expect(shown.balanceMinutes).toBe(foldOf(ledger))
          for (const { block_id } of ledger) {
            expect(foldOf(ledger.filter((entry) => entry.block_id === block_id))).toBeGreaterThanOrEqual(0)
          }
          const credited = credits.reduce((sum, one) => sum + one.minutes, 0)
          const debited = posted.reduce((sum, result) => sum + (result.ok ? result.value.minutes : 0), 0)
          expect(shown.spendableMinutes).toBe(spendable + credited - debited)
        }
      }),
      { numRuns: 25 },
    )
  })
})
