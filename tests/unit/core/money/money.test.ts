import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { cents, sumOfCents } from '@/lib/core/money/cents'
import { formatMoney, moneyText } from '@/lib/core/money/format-money'
import { proportionOf, taxOn } from '@/lib/core/money/proportion'
import { splitByWeights } from '@/lib/core/money/split'

const amount = fc.integer({ min: -1e9, max: 1e9 }).map(cents)

describe('an amount of cents', () => {
  it.each([0.5, NaN, Infinity, 2 ** 53])('is never %d', (value) => {
    expect(() => cents(value)).toThrow(RangeError)
  })
})

describe('a proportion of an amount', () => {
  it.each([
    [100, 1, 3, 33],
    [200, 1, 3, 67],
    [5, 1, 2, 3],
    [-5, 1, 2, -3],
    [5, -1, 2, -3],
    [5, 1, -2, -3],
    [0, 7, 9, 0],
    [9_007_199_254_740_991, 9_007_199_254_740_991, 9_007_199_254_740_991, 9_007_199_254_740_991],
  ])('%d · %d / %d is %d', (value, numerator, denominator, expected) => {
    expect(proportionOf(cents(value), numerator, denominator)).toBe(expected)
  })

  it('is within half a cent of the exact value', () => {
    fc.assert(
      fc.property(
        amount,
        fc.integer({ min: -1e6, max: 1e6 }),
        fc.integer({ min: 1, max: 1e6 }),
        (a, n, d) => {
          const result = BigInt(proportionOf(a, n, d))
          const twice = 2n * (result * BigInt(d) - BigInt(a) * BigInt(n))
          expect(twice <= BigInt(d) && twice >= -BigInt(d)).toBe(true)
        },
      ),
    )
  })

  it('taxes a refund as it taxed the sale', () => {
    fc.assert(
      fc.property(amount, fc.integer({ min: 0, max: 3000 }), (net, rate) => {
        expect(taxOn(cents(-net + 0), rate)).toBe(-taxOn(net, rate) + 0)
      }),
    )
  })

  it('is 19 % of 1,234.50 to the cent', () => {
    expect(taxOn(cents(123_450), 1900)).toBe(23_456)
  })
})

describe('a split by weights', () => {
  it('gives the cents left over to the largest remainders', () => {
    expect(splitByWeights(cents(100), [1, 1, 1])).toEqual([34, 33, 33])
    expect(splitByWeights(cents(100), [3, 5, 7])).toEqual([20, 33, 47])
    expect(splitByWeights(cents(-100), [1, 1, 1])).toEqual([-34, -33, -33])
    expect(splitByWeights(cents(7), [0, 1])).toEqual([0, 7])
  })

  it('adds up exactly and stays within one cent of each exact share', () => {
    const weights = fc
      .array(fc.integer({ min: 0, max: 1e6 }), { minLength: 1, maxLength: 20 })
      .filter((list) => list.some((weight) => weight > 0))
    fc.assert(
      fc.property(amount, weights, (total, list) => {
        const parts = splitByWeights(total, list)
        expect(sumOfCents(parts)).toBe(total)
        const all = list.reduce((sum, weight) => sum + weight, 0)
        for (const [index, part] of parts.entries()) {
          const off = BigInt(part) * BigInt(all) - BigInt(total) * BigInt(list[index] ?? 0)
          expect(off < BigInt(all) && off > -BigInt(all)).toBe(true)
        }
      }),
    )
  })

  it.each([[[]], [[0, 0]], [[1, -1]]])('does not take the weights %j', (weights) => {
    expect(() => splitByWeights(cents(1), weights)).toThrow(RangeError)
  })
})

describe('an amount as text', () => {
  it.each([
    [0, '0.00'],
    [5, '0.05'],
    [123_450, '1,234.50'],
    [-123_456_789, '−1,234,567.89'],
  ])('%d is written %s', (value, text) => {
    expect(formatMoney(cents(value), 'eur')).toEqual({ number: text, currency: 'EUR' })
  })

  it('keeps digits and currency on one line', () => {
    expect(moneyText(cents(100), 'EUR')).toBe('1.00\u00a0EUR')
  })
})
