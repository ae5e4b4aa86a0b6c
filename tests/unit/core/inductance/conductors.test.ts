import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { barMutual, barSelf, barSelfApproximate, type Bar } from '@/lib/core/inductance/bar'
import { facingStripsMeanDistance, rectangleMeanDistance } from '@/lib/core/inductance/mean-distance'
import { alignedFilaments } from '@/lib/core/inductance/parallel-filaments'
import {
  longSolidSelf,
  longTubeSelf,
  solidMeanDistance,
  solidRoundSelf,
  tubeSelf,
} from '@/lib/core/inductance/round-conductor'

import { hoerLove } from './hoer-love'

const near = (a: number, b: number): number => Math.abs(a / b - 1)
const atPlace = { across: 0, up: 0, along: 0 }
const size = fc.integer({ min: 300, max: 3000 }).map((count) => count / 1000)
const bars: fc.Arbitrary<Bar> = fc.record({ width: size, thickness: size, length: size })

describe('the partial inductance of a round wire', () => {
  it('is published: 1 m of 1 mm radius, even current, 2 l (ln 2l/a − ¾) nH/cm = 1.370 µH, Rosa 1908 (from memory)', () => {
    expect(longSolidSelf(1, 1e-3) * 1e6).toBeCloseTo(0.2 * (Math.log(2000) - 0.75), 12)
    expect(near(solidRoundSelf(1, 1e-3), longSolidSelf(1, 1e-3))).toBeLessThan(2e-4)
  })

  it('has next terms of (4/π) a/l on the surface and 0.9054 a/l evenly spread', () => {
    const term = (exact: number, long: number): number => (exact - long) / 2e-7 / 1e-3
    expect(term(tubeSelf(1, 1e-3), longTubeSelf(1, 1e-3))).toBeCloseTo(4 / Math.PI, 3)
    expect(term(solidRoundSelf(1, 1e-3), longSolidSelf(1, 1e-3))).toBeCloseTo(0.9054, 3)
  })

  it('differs between the models of the current by µ₀/8π a metre, 50 nH/m', () => {
    expect(near(solidRoundSelf(10, 1e-4) - tubeSelf(10, 1e-4), 10 * 50e-9)).toBeLessThan(1e-4)
  })

  it('is finite and positive for every shape, and doubles with every length', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -6, max: 4, noNaN: true }),
        fc.double({ min: -6, max: 0, noNaN: true }),
        (l, a) => {
          const [length, radius] = [10 ** l, 10 ** a]
          for (const self of [tubeSelf, solidRoundSelf]) {
            expect(self(length, radius)).toBeGreaterThan(0)
            expect(near(self(2 * length, 2 * radius), 2 * self(length, radius))).toBeLessThan(1e-12)
          }
        },
      ),
    )
  })
})

describe('the partial inductance of a bar', () => {
  it('is the closed form of Hoer and Love where that keeps its digits', () => {
    fc.assert(
      fc.property(bars, (bar) => {
        expect(near(barSelf(bar), hoerLove(bar, bar, atPlace))).toBeLessThan(1e-8)
      }),
      { numRuns: 40 },
    )
  })

  it('of 20 mm of a 1 mm trace of 35 µm is 16.68 nH; the usual form is 0.1 % low', () => {
    const trace = { width: 1e-3, thickness: 35e-6, length: 20e-3 }
    expect(barSelf(trace) * 1e9).toBeCloseTo(16.6798, 4)
    expect(barSelfApproximate(trace) / barSelf(trace) - 1).toBeCloseTo(-0.00093, 4)
  })

  it('keeps its digits for long thin bars: two filaments its mean distance apart, 600 times as long as wide', () => {
    const bar = { width: 0.5e-3, thickness: 35e-6, length: 300e-3 }
    const filaments = alignedFilaments(bar.length, rectangleMeanDistance(bar.width, bar.thickness))
    expect(near(barSelf(bar), filaments)).toBeLessThan(3e-4)
    expect(near(barSelf(bar), barMutual(bar, bar, atPlace))).toBeLessThan(1e-10)
  })

  it('is finite for every shape', () => {
    const wide = fc.double({ min: -7, max: 2, noNaN: true }).map((power) => 10 ** power)
    fc.assert(
      fc.property(fc.record({ width: wide, thickness: wide, length: wide }), (bar) => {
        expect(barSelf(bar)).toBeGreaterThan(0)
        expect(Number.isFinite(barSelf(bar))).toBe(true)
      }),
    )
  })
})

describe('the mutual inductance of bars', () => {
  const offset = fc.integer({ min: -4000, max: 4000 }).map((count) => count / 1000)

  it('is the closed form of Hoer and Love, apart, touching or sharing space, and the same either way round', () => {
    fc.assert(
      fc.property(bars, bars, offset, offset, offset, (first, second, across, up, along) => {
        const mutual = barMutual(first, second, { across, up, along })
        expect(near(mutual, hoerLove(first, second, { across, up, along }))).toBeLessThan(1e-7)
        const turned = barMutual(second, first, { across: -across, up: -up, along: -along })
        expect(near(turned, mutual)).toBeLessThan(1e-9)
      }),
      { numRuns: 20 },
    )
  })

  it('of bars side by side that touch make one bar of twice the width: L = ½ (L₁ + M)', () => {
    const half = { width: 1e-3, thickness: 0.5e-3, length: 8e-3 }
    const mutual = barMutual(half, half, { across: 1e-3, up: 0, along: 0 })
    expect(near((barSelf(half) + mutual) / 2, barSelf({ ...half, width: 2e-3 }))).toBeLessThan(1e-11)
  })
})

describe('geometric mean distances', () => {
  it('are published: 0.7788 a of a disc, 0.22313 w of a line, 0.44705 a of a square, Rosa and Grover (from memory)', () => {
    expect(solidMeanDistance(1)).toBeCloseTo(0.7788, 4)
    expect(rectangleMeanDistance(1, 1e-9)).toBeCloseTo(0.22313, 5)
    expect(rectangleMeanDistance(1, 1)).toBeCloseTo(0.44705, 5)
  })

  it('of facing strips lie between that of one strip and their distance, and join up', () => {
    expect(facingStripsMeanDistance(1, 1e-9)).toBeCloseTo(0.22313, 5)
    expect(facingStripsMeanDistance(1, 1e3)).toBeCloseTo(1e3, 3)
    expect(near(facingStripsMeanDistance(1, 49.999), facingStripsMeanDistance(1, 50.001))).toBeLessThan(5e-5)
  })

  it('make the inductance fall as they grow', () => {
    fc.assert(
      fc.property(size, size, (length, distance) => {
        expect(alignedFilaments(length, 1.01 * distance)).toBeLessThan(alignedFilaments(length, distance))
      }),
    )
  })
})
