import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { decrementOf, naturalFrequency, parasiticsFromShift } from '@/lib/core/snubber/parasitics'

const logarithmic = (low: number, high: number) =>
  fc.double({ noNaN: true, min: Math.log(low), max: Math.log(high) }).map(Math.exp)

describe('parasitics from a shifted ring', () => {
  it('come back from the frequencies that they make', () => {
    fc.assert(
      fc.property(
        logarithmic(1e-10, 1e-6),
        logarithmic(1e-12, 1e-8),
        logarithmic(0.1, 10),
        (inductance, capacitance, share) => {
          const ringOf = (c: number) => 1 / (2 * Math.PI * Math.sqrt(inductance * c))
          const added = share * capacitance
          const found = parasiticsFromShift(ringOf(capacitance), ringOf(capacitance + added), added)
          if (!found.ok) throw new Error('A solution was expected')
          expect(found.value.capacitance / capacitance).toBeCloseTo(1, 9)
          expect(found.value.inductance / inductance).toBeCloseTo(1, 9)
        },
      ),
    )
  })

  it.each([
    [100e6, 100e6],
    [100e6, 120e6],
    [Number.NaN, 1],
  ])('are refused for %d and %d Hz', (bare, loaded) => {
    expect(parasiticsFromShift(bare, loaded, 1e-10).ok).toBe(false)
  })
})

describe('the logarithmic decrement', () => {
  // By hand: e a cycle is δ = 1, ζ = 1/√(1 + 4π²) = 0.15718.
  it('of a ring that falls by e a cycle is 1', () => {
    const found = decrementOf(Math.E ** 3, 1, 3)
    expect(found.ok && found.value.logarithmicDecrement).toBeCloseTo(1, 12)
    expect(found.ok && found.value.dampingRatio).toBeCloseTo(0.157177, 6)
  })

  it('comes back from a ring of any damping', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 0.9, noNaN: true }),
        fc.integer({ min: 1, max: 5 }),
        (zeta, n) => {
          const fall = Math.exp((2 * Math.PI * zeta * n) / Math.sqrt(1 - zeta ** 2))
          const found = decrementOf(fall, 1, n)
          expect(found.ok && found.value.dampingRatio).toBeCloseTo(zeta, 9)
          expect(naturalFrequency(Math.sqrt(1 - zeta ** 2), zeta)).toBeCloseTo(1, 12)
        },
      ),
    )
  })

  it.each([
    [1, 1],
    [1, 2],
    [1, 0],
    [1, -0.5],
  ])('is refused for peaks of %d and %d', (first, later) => {
    expect(decrementOf(first, later, 2).ok).toBe(false)
  })
})
