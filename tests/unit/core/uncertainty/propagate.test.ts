import { describe, expect, it } from 'vitest'

import { err, ok } from '@/lib/core/result'
import { propagate, type UncertainInput } from '@/lib/core/uncertainty/propagate'
import type { Tolerance } from '@/lib/core/uncertainty/tolerance'

const input = (key: string, value: number, halfWidth: number, distribution: Tolerance['distribution']) =>
  ({ key, value, tolerance: { halfWidth, distribution }, isPossible: () => true }) satisfies UncertainInput

function intervalOf(inputs: readonly UncertainInput[], model: (values: Record<string, number>) => number) {
  const spread = propagate(inputs, (values) => ok({ result: model(values) }))
  const interval = spread.ok ? spread.value.intervals[0] : undefined
  if (interval === undefined) throw new Error('An interval was expected')
  return interval
}

// Source: closed forms of the distributions; the sums of rectangular distributions are the example of JCGM 101:2008, 9.2.
describe('the 95 % interval', () => {
  it('of one rectangular input holds the middle 95 % of its width', () => {
    const { low, high } = intervalOf([input('x', 10, 1, 'rectangular')], ({ x = 0 }) => x)
    expect(Math.abs(low - 9.05)).toBeLessThan(0.02)
    expect(Math.abs(high - 10.95)).toBeLessThan(0.02)
  })

  it('of one normal input with k = 2 is 1.96 standard uncertainties', () => {
    const { low, high } = intervalOf([input('x', 10, 1, 'normal')], ({ x = 0 }) => x)
    expect(Math.abs(low - (10 - 1.959964 / 2))).toBeLessThan(0.03)
    expect(Math.abs(high - (10 + 1.959964 / 2))).toBeLessThan(0.03)
  })

  it('of the sum of four rectangular inputs of unit standard uncertainty is ±3.88', () => {
    const inputs = ['a', 'b', 'c', 'd'].map((key) => input(key, 0, Math.sqrt(3), 'rectangular'))
    const { low, high } = intervalOf(inputs, (values) => Object.values(values).reduce((a, b) => a + b, 0))
    expect(Math.abs(low + 3.88)).toBeLessThan(0.08)
    expect(Math.abs(high - 3.88)).toBeLessThan(0.08)
  })

  it('names the input that spreads the result most, with its part of the variance', () => {
    const inputs = [input('a', 1, 0.1, 'rectangular'), input('b', 1, 0.3, 'rectangular')]
    const { dominant } = intervalOf(inputs, ({ a = 0, b = 0 }) => a + b)
    expect(dominant?.input).toBe('b')
    expect(Math.abs((dominant?.share ?? 0) - 0.9)).toBeLessThan(0.01)
  })

  it('names none where the result does not depend on the inputs', () => {
    expect(intervalOf([input('a', 1, 0.1, 'normal')], () => 5)).toEqual({
      key: 'result',
      low: 5,
      high: 5,
      dominant: null,
    })
  })

  it('draws again what is not possible', () => {
    const positive = { ...input('x', 0.1, 1, 'rectangular'), isPossible: (value: number) => value >= 0 }
    const { low, high } = intervalOf([positive], ({ x = 0 }) => x)
    expect(Math.abs(low - 0.025 * 1.1)).toBeLessThan(0.01)
    expect(Math.abs(high - 0.975 * 1.1)).toBeLessThan(0.01)
  })

  it('is the same, digit for digit, when it is computed again', () => {
    const inputs = [input('a', 1, 0.1, 'normal'), input('b', 1, 0.3, 'rectangular')]
    const product = ({ a = 0, b = 0 }) => a * b
    expect(intervalOf(inputs, product)).toEqual(intervalOf(inputs, product))
  })
})

describe('what has no interval', () => {
  it('passes on the failure of the model', () => {
    expect(
      propagate([input('a', 1, 2, 'rectangular')], ({ a = 0 }) => (a > 2 ? err('beyond') : ok({ a }))),
    ).toEqual(err('beyond'))
  })

  it('ends where no possible value is within the tolerance', () => {
    const impossible = { ...input('x', -5, 1, 'rectangular'), isPossible: (value: number) => value >= 0 }
    expect(propagate([impossible], (values) => ok(values))).toEqual(err(null))
  })
})
