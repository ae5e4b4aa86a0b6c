import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { clipPolyline, clipSegment, pathOf, type Point } from '@/lib/figure/polyline'

const plot = { x: 10, y: 20, width: 100, height: 50 }

describe('clipping to the plot', () => {
  it('cuts a line that crosses the plot at both edges', () => {
    const [[x1, y1], [x2, y2]] = clipSegment([0, 45], [200, 45], plot) ?? [[], []]
    expect([x1, y1, y2]).toEqual([10, 45, 45])
    expect(x2).toBeCloseTo(110, 9)
  })

  it('keeps what is inside, drops what is outside', () => {
    expect(clipSegment([20, 30], [30, 40], plot)).toEqual([
      [20, 30],
      [30, 40],
    ])
    expect(clipSegment([0, 0], [5, 5], plot)).toBeNull()
    expect(clipSegment([0, 10], [200, 10], plot)).toBeNull()
  })

  it('starts a new run after a gap and after leaving the plot', () => {
    const points: (Point | null)[] = [[20, 30], [30, 30], null, [40, 30], [50, 0], [60, 30]]
    expect(clipPolyline(points, plot)).toHaveLength(3)
  })

  it('keeps a line that lies inside as one run, whatever the digits of its points', () => {
    const inside = fc.tuple(
      fc.double({ min: 10, max: 110, noNaN: true }),
      fc.double({ min: 20, max: 70, noNaN: true }),
    )
    fc.assert(
      fc.property(fc.array(inside, { minLength: 2, maxLength: 20 }), (points) => {
        expect(clipPolyline(points, plot)).toEqual([points])
      }),
    )
  })

  it('never leaves the plot, whatever the points', () => {
    const coordinate = fc.double({ min: -1e6, max: 1e6, noNaN: true })
    fc.assert(
      fc.property(fc.array(fc.tuple(coordinate, coordinate), { maxLength: 20 }), (points) => {
        for (const [x, y] of clipPolyline(points, plot).flat()) {
          expect(x).toBeGreaterThanOrEqual(plot.x - 1e-6)
          expect(x).toBeLessThanOrEqual(plot.x + plot.width + 1e-6)
          expect(y).toBeGreaterThanOrEqual(plot.y - 1e-6)
          expect(y).toBeLessThanOrEqual(plot.y + plot.height + 1e-6)
        }
      }),
    )
  })

  it('writes path data to a hundredth', () => {
    expect(
      pathOf([
        [
          [1, 2],
          [3.14159, 4],
        ],
      ]),
    ).toBe('M1,2L3.14,4')
  })
})
