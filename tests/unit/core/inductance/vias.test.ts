import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { alignedFilaments } from '@/lib/core/inductance/parallel-filaments'
import { longTubeSelf, tubeSelf } from '@/lib/core/inductance/round-conductor'
import type { Point2 } from '@/lib/core/linear/point'
import { planeSpreading, viaPair, viaPairThin, viaWithReturns } from '@/lib/core/inductance/via'
import { viaArray } from '@/lib/core/inductance/via-array'
import { viaFluxToSurface, viaMicrostripFit, viaPopular } from '@/lib/core/inductance/via-partial'

import { valueOf } from '../../../support/value-of'

const near = (a: number, b: number): number => Math.abs(a / b - 1)
const via = { length: 1.6e-3, diameter: 0.3e-3 }
const grid: readonly Point2[] = [0, 1, 2].flatMap((x) => [0, 1, 2].map((y): Point2 => [x * 1e-3, y * 1e-3]))

describe('one via', () => {
  it('of 1.6 mm and 0.3 mm has 0.696 nH; the popular form with + 1 says 1.30 nH', () => {
    expect(tubeSelf(1.6e-3, 0.15e-3) * 1e9).toBeCloseTo(0.6961, 4)
    expect(viaPopular(1.6e-3, 0.3e-3) * 1e9).toBeCloseTo(1.2993, 4)
  })

  it('is overrated by the popular form by 10.16 nH an inch', () => {
    const inch = 25.4e-3
    expect((viaPopular(inch, 0.3e-3) - longTubeSelf(inch, 0.15e-3)) * 1e9).toBeCloseTo(10.16, 6)
    expect((viaPopular(inch, 0.3e-3) / (5.08e-9 * (Math.log((4 * 25.4) / 0.3) + 1))).toFixed(6)).toBe(
      '1.000000',
    )
  })

  it('tends to “− 1” by the tube and by the flux, to “− 3/2” by the fit', () => {
    const constant = (value: number): number => value / 2e-7 - Math.log(2 / 1e-5)
    expect(constant(tubeSelf(1, 1e-5))).toBeCloseTo(-1, 4)
    expect(constant(viaFluxToSurface(1, 1e-5))).toBeCloseTo(-1, 4)
    expect(constant(viaMicrostripFit(1, 1e-5))).toBeCloseTo(-1.5, 4)
  })
})

describe('vias between planes', () => {
  it('with one return are the pair; with two, by hand: (µ₀h/2π)(1.5 ln(s/r) − 0.5 ln 2)', () => {
    expect(near(viaWithReturns(1e-3, 5e-3, 0.3e-3, 1), viaPairThin(1e-3, 5e-3, 0.3e-3))).toBeLessThan(1e-14)
    expect(near(viaPair(1e-3, 50e-3, 0.3e-3), viaPairThin(1e-3, 50e-3, 0.3e-3))).toBeLessThan(1e-5)
    const two = 2e-10 * (1.5 * Math.log(1 / 0.15) - 0.5 * Math.LN2)
    expect(near(viaWithReturns(1e-3, 1e-3, 0.3e-3, 2), two)).toBeLessThan(1e-12)
  })

  it('spread twice to infinity-like distance as the pair: two rings of radius s', () => {
    expect(near(2 * planeSpreading(1e-3, 10e-3, 0.15e-3), viaPairThin(1e-3, 10e-3, 0.3e-3))).toBeLessThan(
      1e-12,
    )
  })
})

describe('vias in parallel', () => {
  it('two share evenly: (L + M)/2', () => {
    const both = valueOf(
      viaArray({
        ...via,
        positions: [
          [0, 0],
          [1e-3, 0],
        ],
      }),
    )
    for (const share of both.shares) expect(share).toBeCloseTo(0.5, 14)
    expect(
      near(both.effective, (tubeSelf(1.6e-3, 0.15e-3) + alignedFilaments(1.6e-3, 1e-3)) / 2),
    ).toBeLessThan(1e-12)
  })

  it('nine in a grid have 2.8 times a ninth, and the middle one carries 5 %', () => {
    const nine = valueOf(viaArray({ ...via, positions: grid }))
    expect(nine.ratioToShare).toBeCloseTo(2.803, 3)
    expect(nine.shares[4]).toBeCloseTo(0.0537, 4)
  })

  it('have no order and no place, share all of the current, and never more than one alone', () => {
    fc.assert(
      fc.property(fc.shuffledSubarray([...grid], { minLength: 1 }), (positions) => {
        const array = valueOf(viaArray({ ...via, positions }))
        const sorted = valueOf(
          viaArray({ ...via, positions: positions.toSorted((a, b) => a[0] - b[0] || a[1] - b[1]) }),
        )
        expect(array.shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12)
        expect(near(array.effective, sorted.effective)).toBeLessThan(1e-12)
        expect(array.effective).toBeLessThanOrEqual(array.single * (1 + 1e-12))
        expect(array.ratioToShare).toBeGreaterThanOrEqual(1 - 1e-12)
      }),
    )
  })

  it('are refused where they touch, and none at all', () => {
    const touching = viaArray({
      ...via,
      positions: [
        [0, 0],
        [5e-3, 0],
        [5.3e-3, 0],
      ],
    })
    expect(touching.ok ? '' : touching.error.message).toContain('Vias 2 and 3')
    const none = viaArray({ ...via, positions: [] })
    expect(none.ok ? '' : none.error.code).toBe('too_few_points')
  })
})
