import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { completeK } from '@/lib/core/elliptic/complete-integrals'
import { coplanarPair, coplanarPairUniform } from '@/lib/core/inductance/coplanar-pair'
import {
  roundPair,
  roundPairThin,
  roundPairUniform,
  stripOverPlane,
  wideStripOverPlane,
  wireOverPlane,
} from '@/lib/core/inductance/line'
import { stripOverPlaneExact } from '@/lib/core/inductance/strip-solution'
import { stripOverPlaneWidened, thickStripOverPlane } from '@/lib/core/inductance/thick-strip'

const near = (a: number, b: number): number => Math.abs(a / b - 1)
const mu = 4e-7 * Math.PI
const length = fc.double({ min: -4, max: -1, noNaN: true }).map((power) => 10 ** power)

describe('a strip over a plane', () => {
  it('is the formula of Hammerstad and Jensen to 8e-5 up to w/h = 100, to 2.5e-4 beyond', () => {
    for (let ratio = 1e-4; ratio < 100; ratio *= 2) {
      expect(near(stripOverPlane(ratio, 1), stripOverPlaneExact(ratio, 1))).toBeLessThan(8e-5)
    }
    for (const ratio of [200, 1e3, 1e5]) {
      expect(near(stripOverPlane(ratio, 1), stripOverPlaneExact(ratio, 1))).toBeLessThan(2.5e-4)
    }
  })

  it('is a wire of a quarter of its width when narrow', () => {
    expect(near(stripOverPlaneExact(1e-6, 1), wireOverPlane(1, 0.25e-6))).toBeLessThan(1e-9)
  })

  it('joins its solution and its expansion for wide strips, which tends to µ₀ h/w', () => {
    expect(near(stripOverPlaneExact(59.9999, 1), stripOverPlaneExact(60, 1))).toBeLessThan(2e-5)
    expect(near(stripOverPlaneExact(1e6, 1), wideStripOverPlane(1e6, 1))).toBeLessThan(2e-5)
  })

  it('has less with thickness; boundary elements and the correction of the width agree to 0.4 %', () => {
    for (const [width, height, thickness] of [
      [0.5e-3, 0.2e-3, 35e-6],
      [1e-3, 0.2e-3, 35e-6],
      [0.2e-3, 0.2e-3, 18e-6],
      [3e-3, 0.1e-3, 70e-6],
    ] as const) {
      const solved = thickStripOverPlane(width, height, thickness) ?? Number.NaN
      expect(solved).toBeLessThan(stripOverPlaneExact(width, height))
      expect(near(solved, stripOverPlaneWidened(width, height, thickness))).toBeLessThan(4e-3)
    }
    const foil = thickStripOverPlane(1e-3, 0.2e-3, 1e-8) ?? Number.NaN
    expect(near(foil, stripOverPlaneExact(1e-3, 0.2e-3))).toBeLessThan(4e-4)
  })

  it('as a solid square far over the plane is a wire of 0.59017 of its side, from conformal mapping (from memory)', () => {
    const square = thickStripOverPlane(1, 1e3, 1) ?? Number.NaN
    expect(near(square, wireOverPlane(1e3 + 0.5, 0.59017))).toBeLessThan(2e-4)
  })
})

describe('two strips in one plane', () => {
  it('of equal width are µ₀ K(q)/K(q′), q = s/(s + 2w), by Landen’s transformation', () => {
    fc.assert(
      fc.property(length, length, (width, gap) => {
        const modulus = gap / (gap + 2 * width)
        const other = Math.sqrt((2 * width * (2 * gap + 2 * width)) / (gap + 2 * width) ** 2)
        const expected = (mu * completeK(modulus, other)) / completeK(other, modulus)
        expect(near(coplanarPair({ width1: width, width2: width, gap }), expected)).toBeLessThan(1e-11)
      }),
    )
  })

  it('have less with their current at the edges than evenly spread, and the same either way round', () => {
    fc.assert(
      fc.property(length, length, length, (width1, width2, gap) => {
        const pair = { width1, width2, gap }
        const turned = { width1: width2, width2: width1, gap }
        expect(coplanarPair(pair)).toBeLessThan(coplanarPairUniform(pair))
        expect(near(coplanarPair(turned), coplanarPair(pair))).toBeLessThan(1e-12)
        expect(near(coplanarPairUniform(turned), coplanarPairUniform(pair))).toBeLessThan(1e-9)
      }),
    )
  })

  it('narrow and far apart are wires of w/4, and of 0.22313 w evenly spread', () => {
    const pair = { width1: 1e-5, width2: 1e-5, gap: 1 }
    expect(near(coplanarPair(pair), roundPairThin(1 + 1e-5, 0.25e-5))).toBeLessThan(1e-9)
    expect(near(coplanarPairUniform(pair), roundPairThin(1 + 1e-5, 1e-5 * Math.exp(-1.5)))).toBeLessThan(1e-9)
  })

  it('evenly spread and touching: by hand for w = 1, ln g₁₂ = 2 ln 2 − 3/2, so L′ = (µ₀/2π) 4 ln 2', () => {
    expect(
      near(coplanarPairUniform({ width1: 1, width2: 1, gap: 1e-14 }), (mu / (2 * Math.PI)) * 4 * Math.LN2),
    ).toBeLessThan(1e-11)
  })
})

describe('two round wires', () => {
  it('come nearer to thin wires the farther they are apart', () => {
    expect(near(roundPair(1, 1e-4), roundPairThin(1, 1e-4))).toBeLessThan(1e-8)
    expect(roundPair(2.2, 1)).toBeLessThan(roundPairThin(2.2, 1))
    expect(roundPairUniform(1, 0.1) - roundPairThin(1, 0.1)).toBeCloseTo(1e-7, 15)
  })
})
