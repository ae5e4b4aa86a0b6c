import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { copyCurve } from '@/lib/core/inductance/copy-curve'
import { filamentMutual } from '@/lib/core/inductance/filament-mutual'
import { circularLoop, rectangularLoop } from '@/lib/core/inductance/loop'
import type { Point2 } from '@/lib/core/linear/point'
import { simplePolygon } from '@/lib/core/inductance/polygon'
import {
  conductorFits,
  contourOffsetLoop,
  mutualWithCopy,
  partialSumLoop,
} from '@/lib/core/inductance/polygon-loop'

import { circleOf, lShape, outlines, polygon } from './loops-for-tests'

const meanDistance = 0.2e-3

const free = (corners: readonly Point2[], g = meanDistance): number =>
  contourOffsetLoop(polygon(corners), { meanDistance: g })

const overPlane = (corners: readonly Point2[], height: number): number =>
  contourOffsetLoop(polygon(corners), { meanDistance, imageDistance: 2 * height })

const near = (a: number, b: number): number => Math.abs(a / b - 1)

describe('the inductance of a polygon', () => {
  it('goes over into that of a circle, Maxwell 1865', () => {
    const circle = circularLoop(0.02, meanDistance, 'surface')
    expect(near(free(circleOf(400, 0.02)), circle)).toBeLessThan(5e-4)
    expect(near(free(circleOf(24, 0.02)), circle)).toBeLessThan(0.02)
  })

  it('is that of a rectangle by Grover’s formula to what its corners leave open', () => {
    const corners: readonly Point2[] = [
      [0, 0],
      [0.05, 0],
      [0.05, 0.02],
      [0, 0.02],
    ]
    expect(near(free(corners), rectangularLoop(0.05, 0.02, meanDistance, 'surface'))).toBeLessThan(0.003)
  })

  it('has no direction, no first corner and no place', () => {
    fc.assert(
      fc.property(
        outlines,
        fc.nat(8),
        fc.double({ min: -1, max: 1, noNaN: true }),
        (corners, turn, shift) => {
          const first = turn % corners.length
          const moved = [...corners.slice(first), ...corners.slice(0, first)].map(([x, y]): Point2 => [
            x + shift,
            y - 2 * shift,
          ])
          const expected = overPlane(corners, 1e-3)
          expect(near(overPlane(moved, 1e-3), expected)).toBeLessThan(1e-9)
          expect(near(overPlane(corners.toReversed(), 1e-3), expected)).toBeLessThan(1e-9)
          expect(
            near(
              overPlane(
                corners.map(([x, y]): Point2 => [-y, x]),
                1e-3,
              ),
              expected,
            ),
          ).toBeLessThan(1e-9)
        },
      ),
      { numRuns: 60 },
    )
  })

  it('does not change where sides are divided; the sum of partial inductances does', () => {
    fc.assert(
      fc.property(
        outlines,
        fc.nat(8),
        fc.double({ min: 0.02, max: 0.98, noNaN: true }),
        (corners, at, share) => {
          const index = at % corners.length
          const [x0, y0] = corners[index] ?? [0, 0]
          const [x1, y1] = corners[(index + 1) % corners.length] ?? [0, 0]
          const middle: Point2 = [x0 + share * (x1 - x0), y0 + share * (y1 - y0)]
          const divided = [...corners.slice(0, index + 1), middle, ...corners.slice(index + 1)]
          expect(near(free(divided), free(corners))).toBeLessThan(1e-8)
          expect(partialSumLoop(polygon(divided), meanDistance)).toBeGreaterThan(
            partialSumLoop(polygon(corners), meanDistance),
          )
        },
      ),
      { numRuns: 60 },
    )
  })

  it('doubles when every length doubles, falls with a thicker conductor, and with a nearer plane', () => {
    fc.assert(
      fc.property(outlines, (corners) => {
        const doubled = corners.map(([x, y]): Point2 => [2 * x, 2 * y])
        expect(near(free(doubled, 2 * meanDistance), 2 * free(corners))).toBeLessThan(1e-9)
        expect(free(corners, 1.3 * meanDistance)).toBeLessThan(free(corners))
        const heights = [0.5e-3, 1e-3, 3e-3, 0.1].map((height) => overPlane(corners, height))
        expect(heights).toEqual(heights.toSorted((a, b) => a - b))
        expect(heights[0]).toBeGreaterThan(0)
        expect(heights[3]).toBeLessThan(free(corners))
      }),
      { numRuns: 60 },
    )
  })

  it('is found in far pairs by quadrature to 1e-8 of the closed form of each pair', () => {
    const [corners, apart] = [circleOf(60, 0.02), 1e-4]
    const closed = pairByPair(corners, apart)
    expect(near(mutualWithCopy(polygon(corners), apart), closed)).toBeLessThan(1e-8)
    expect(near(mutualWithCopy(polygon(lShape), apart), pairByPair(lShape, apart))).toBeLessThan(1e-8)
  })

  it('follows a curve over the distance of the copy to 1e-6', () => {
    const loop = polygon(lShape)
    const curve = copyCurve(loop)
    for (let apart = 1e-6; apart < 1; apart *= 1.7) {
      expect(near(curve(apart), mutualWithCopy(loop, apart))).toBeLessThan(1e-6)
    }
  })
})

describe('an outline', () => {
  const refusals: readonly (readonly [string, readonly Point2[]])[] = [
    [
      'too_few_points',
      [
        [0, 0],
        [1, 1],
      ],
    ],
    [
      'self_intersecting',
      [
        [0, 0],
        [1, 1],
        [1, 0],
        [0, 1],
      ],
    ],
    [
      'self_intersecting',
      [
        [0, 0],
        [2, 0],
        [2, 1],
        [1, 0],
        [0, 1],
      ],
    ],
    [
      'self_intersecting',
      [
        [0, 0],
        [1, 0],
        [0.5, 0],
        [0.5, 1],
      ],
    ],
    [
      'self_intersecting',
      [
        [0, 0],
        [1, 0],
        [2, 0],
      ],
    ],
    [
      'zero_length',
      [
        [0, 0],
        [1, 0],
        [1, 0],
        [0, 1],
      ],
    ],
    [
      'zero_length',
      [
        [0, 0],
        [1, 0],
        [1, 1],
        [0, 0],
      ],
    ],
    [
      'not_finite',
      [
        [0, 0],
        [1, Number.NaN],
        [1, 1],
      ],
    ],
    [
      'not_finite',
      [
        [0, 0],
        [Number.POSITIVE_INFINITY, 1],
        [1, 1],
      ],
    ],
  ]

  it.each(refusals)('is refused as %s', (code, corners) => {
    const taken = simplePolygon(corners)
    expect(taken.ok ? null : taken.error.code).toBe(code)
  })

  it('names the sides that cross', () => {
    const taken = simplePolygon([
      [0, 0],
      [1, 1],
      [1, 0],
      [0, 1],
    ])
    expect(taken.ok ? '' : taken.error.message).toBe('Sides 1 and 3 cross or touch.')
  })

  it('has the area and length of its shape, far from the origin too', () => {
    const { area, perimeter } = polygon(lShape.map(([x, y]): Point2 => [x + 100, y - 50]))
    expect(area).toBeCloseTo(7e-4, 12)
    expect(perimeter).toBeCloseTo(0.14, 12)
  })

  it('refuses a conductor that fills it or touches the plane', () => {
    const loop = polygon(lShape)
    const codeOf = (g: number, height?: number): string | null => {
      const fits = conductorFits(loop, g, height)
      return fits.ok ? null : fits.error.code
    }
    expect(codeOf(0.3e-3, 1e-3)).toBeNull()
    expect(codeOf(0.006)).toBe('too_thick')
    expect(codeOf(1.1e-3, 1e-3)).toBe('too_thick')
    expect(codeOf(0.3e-3, 0)).toBe('not_positive')
    expect(codeOf(Number.NaN)).toBe('not_positive')
  })
})

/** The same sum with the closed form for every pair, from the general function of two segments in space. */
function pairByPair(corners: readonly Point2[], apart: number): number {
  let sum = 0
  for (const [i, [ax, ay]] of corners.entries()) {
    const [bx, by] = corners[(i + 1) % corners.length] ?? [0, 0]
    for (const [j, [cx, cy]] of corners.entries()) {
      const [dx, dy] = corners[(j + 1) % corners.length] ?? [0, 0]
      const first = { start: [ax, ay, 0], end: [bx, by, 0] } as const
      const second = { start: [cx, cy, apart], end: [dx, dy, apart] } as const
      const mutual = filamentMutual(first, second)
      sum += mutual.ok ? mutual.value : Number.NaN
    }
  }
  return sum
}
