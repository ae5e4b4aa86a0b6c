import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { coaxialCircles, fluxThroughInnerEdge } from '@/lib/core/inductance/coaxial-circles'
import { conductingRing } from '@/lib/core/inductance/conducting-ring'
import { circularLoop, circularLoopSecondOrder } from '@/lib/core/inductance/loop'

const near = (a: number, b: number): number => Math.abs(a / b - 1)

describe('coaxial circles', () => {
  it('of 25 and 20 cm, 10 cm apart, have 248.7874 nH: Rosa and Grover 1912, example (from memory)', () => {
    expect(coaxialCircles(0.25, 0.2, 0.1) * 1e9).toBeCloseTo(248.7874, 4)
  })

  it('far apart are two dipoles: µ₀ π a² b²/(2 z³)', () => {
    const dipoles = (4e-7 * Math.PI * Math.PI * 0.01 ** 2 * 0.02 ** 2) / (2 * 50 ** 3)
    expect(near(coaxialCircles(0.01, 0.02, 50), dipoles)).toBeLessThan(1e-6)
  })

  it('give the same either way round, and have no finite value on each other', () => {
    const length = fc.double({ min: 1e-3, max: 1, noNaN: true })
    fc.assert(
      fc.property(length, length, length, (a, b, z) => {
        expect(near(coaxialCircles(a, b, z), coaxialCircles(b, a, -z))).toBeLessThan(1e-12)
        expect(near(coaxialCircles(2 * a, 2 * b, 2 * z), 2 * coaxialCircles(a, b, z))).toBeLessThan(1e-12)
      }),
    )
    expect(coaxialCircles(0.1, 0.1, 0)).toBe(Infinity)
  })
})

describe('a ring of round wire', () => {
  it('of 25 cm and 0.5 mm with even current has 654.40496 π cm: Rosa and Grover 1912, example (from memory)', () => {
    expect(circularLoopSecondOrder(0.25, 0.0005) * 1e9).toBeCloseTo(654.40496 * Math.PI, 2)
  })

  it('as a perfect conductor is 0.32, 1.1 and 3.9 % below the thin form at r/a = 0.05, 0.1 and 0.2', () => {
    const below = (ratio: number): number => 1 - conductingRing(1, ratio) / circularLoop(1, ratio, 'surface')
    expect(below(0.05)).toBeCloseTo(0.00323, 5)
    expect(below(0.1)).toBeCloseTo(0.01128, 5)
    expect(below(0.2)).toBeCloseTo(0.03905, 5)
    expect(Math.abs(below(1e-6))).toBeLessThan(1e-10)
  })

  it('as a perfect conductor has a finite value for every thickness, and less the thicker it is', () => {
    fc.assert(
      fc.property(fc.double({ min: -9, max: -1e-6, noNaN: true }), (power) => {
        const ratio = 10 ** power
        expect(conductingRing(1, ratio)).toBeGreaterThan(0)
        expect(conductingRing(1, ratio)).toBeLessThan(conductingRing(1, 0.99 * ratio))
      }),
    )
  })

  it('has more than the flux through its inner edge, which is 3 to 11 % low', () => {
    const low = (ratio: number): number => 1 - fluxThroughInnerEdge(1, ratio) / conductingRing(1, ratio)
    expect(low(0.05)).toBeCloseTo(0.03, 2)
    expect(low(0.2)).toBeGreaterThan(0.08)
  })
})
