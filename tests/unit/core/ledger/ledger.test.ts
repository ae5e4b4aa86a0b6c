import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { allocateDebit, type OpenBlock } from '@/lib/core/ledger/allocate-debit'
import { balanceAt, balanceOf, remainingByBlock, totalsByKind } from '@/lib/core/ledger/balance'
import { billableMinutes } from '@/lib/core/ledger/billable-minutes'
import { ledgerKinds, type LedgerEntry } from '@/lib/core/ledger/ledger-entry'
import { minutes } from '@/lib/core/ledger/minutes'

const entryOf = (kind: LedgerEntry['kind'], moved: number, blockId: string, at: number): LedgerEntry => ({
  kind,
  minutes: minutes(moved),
  blockId,
  at,
})

const entry = fc
  .record({
    kind: fc.constantFrom(...ledgerKinds),
    moved: fc.integer({ min: -10_000, max: 10_000 }),
    blockId: fc.constantFrom('A', 'B', 'C'),
    at: fc.integer({ min: 0, max: 100 }),
  })
  .map(({ kind, moved, blockId, at }) => entryOf(kind, moved, blockId, at))

describe('the balance of the hour ledger', () => {
  const story = [
    entryOf('credit', 600, 'A', 10),
    entryOf('debit', -90, 'A', 20),
    entryOf('credit', 300, 'B', 30),
    entryOf('reversal', 90, 'A', 40),
    entryOf('debit', -84, 'A', 40),
    entryOf('expiry', -516, 'A', 50),
    entryOf('adjustment', -6, 'B', 60),
  ]

  it('is the fold of its entries, in all, by block, by kind and at any instant', () => {
    expect(balanceOf(story)).toBe(294)
    expect(Object.fromEntries(remainingByBlock(story))).toEqual({ A: 0, B: 294 })
    expect(totalsByKind(story)).toEqual({
      credit: 900,
      debit: -174,
      reversal: 90,
      expiry: -516,
      adjustment: -6,
    })
    expect(balanceAt(story, 30)).toBe(810)
    expect(balanceAt(story, 9)).toBe(0)
  })

  it('BZ1: does not depend on the order of entries, and a reversal undoes its entry', () => {
    fc.assert(
      fc.property(fc.array(entry), entry, (entries, extra) => {
        const balance = balanceOf(entries)
        expect(balanceOf([...entries].reverse())).toBe(balance)
        const undone = entryOf('reversal', -extra.minutes + 0, extra.blockId, extra.at)
        expect(balanceOf([...entries, extra, undone])).toBe(balance)
        const byBlock = [...remainingByBlock(entries).values()]
        expect(balanceOf(byBlock.map((left) => ({ minutes: left })))).toBe(balance)
        expect(balanceOf(Object.values(totalsByKind(entries)).map((left) => ({ minutes: left })))).toBe(
          balance,
        )
      }),
    )
  })
})

const blockOf = (id: string, remaining: number, validFrom: number, validUntil: number): OpenBlock => ({
  id,
  remaining: minutes(remaining),
  validFrom,
  validUntil,
})

describe('allocating a debit', () => {
  const blocks = [blockOf('new', 300, 20, 200), blockOf('old', 60, 0, 100), blockOf('older', 6, -10, 50)]

  it('takes the oldest valid block first', () => {
    expect(allocateDebit(blocks, minutes(90), 30)).toEqual({
      ok: true,
      value: [
        { blockId: 'older', minutes: 6 },
        { blockId: 'old', minutes: 60 },
        { blockId: 'new', minutes: 24 },
      ],
    })
  })

  it('takes nothing from a block before it begins or from the moment it ends', () => {
    expect(allocateDebit(blocks, minutes(1), 19)).toMatchObject({ value: [{ blockId: 'older' }] })
    expect(allocateDebit(blocks, minutes(1), 50)).toMatchObject({ value: [{ blockId: 'old' }] })
    expect(allocateDebit(blocks, minutes(1), 200)).toEqual({
      ok: false,
      error: { code: 'insufficient_hours', needed: 1, available: 0 },
    })
  })

  it('is refused as a whole when the valid blocks do not suffice', () => {
    expect(allocateDebit(blocks, minutes(367), 30)).toEqual({
      ok: false,
      error: { code: 'insufficient_hours', needed: 367, available: 366 },
    })
  })

  it('BZ1: never overdraws a block and allocates what was needed, or tells what there is', () => {
    const block = fc
      .record({
        id: fc.uuid(),
        remaining: fc.integer({ min: 0, max: 1000 }),
        from: fc.integer({ min: 0, max: 100 }),
        length: fc.integer({ min: 1, max: 100 }),
      })
      .map(({ id, remaining, from, length }) => blockOf(id, remaining, from, from + length))
    fc.assert(
      fc.property(
        fc.array(block),
        fc.integer({ min: 1, max: 3000 }),
        fc.integer({ min: 0, max: 200 }),
        (list, needed, now) => {
          const result = allocateDebit(list, minutes(needed), now)
          const available = list
            .filter(({ validFrom, validUntil }) => validFrom <= now && now < validUntil)
            .reduce((sum, { remaining }) => sum + remaining, 0)
          if (!result.ok) {
            expect(result.error).toMatchObject({ needed, available })
            expect(available).toBeLessThan(needed)
            return
          }
          expect(balanceOf(result.value)).toBe(needed)
          for (const { blockId, minutes: taken } of result.value) {
            expect(taken).toBeGreaterThan(0)
            expect(taken).toBeLessThanOrEqual(list.find(({ id }) => id === blockId)?.remaining ?? 0)
          }
        },
      ),
    )
  })
})

describe('BZ4: worked time in increments of six minutes', () => {
  it.each([
    [0, 0],
    [1, 6],
    [359, 6],
    [360, 6],
    [361, 12],
    [3600, 60],
    [86_400, 1440],
  ])('%d s counts for %d min', (worked, billed) => {
    expect(billableMinutes(worked)).toBe(billed)
  })

  it('takes another increment', () => {
    expect(billableMinutes(61, 1)).toBe(2)
    expect(billableMinutes(61, 15)).toBe(15)
  })

  it('takes no negative time', () => {
    expect(() => billableMinutes(-1)).toThrow(RangeError)
  })
})
