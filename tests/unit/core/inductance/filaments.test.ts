import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { filamentMutual, type Segment } from '@/lib/core/inductance/filament-mutual'
import { alignedFilaments, parallelFilaments } from '@/lib/core/inductance/parallel-filaments'
import type { Point3 } from '@/lib/core/linear/point'

const mutual = (a: Segment, b: Segment): number => {
  const answer = filamentMutual(a, b)
  return answer.ok ? answer.value : Number.NaN
}

const coordinate = fc.integer({ min: -1000, max: 1000 }).map((count) => count / 1000)
const point = fc.tuple(coordinate, coordinate, coordinate)
const segment = fc
  .record({ start: point, end: point })
  .filter(({ start, end }) => Math.hypot(...start.map((s, i) => s - (end[i] ?? 0))) > 1e-3)

const reversed = ({ start, end }: Segment): Segment => ({ start: end, end: start })

const onAxis = (from: number, to: number): Segment => ({ start: [from, 0, 0], end: [to, 0, 0] })

describe('two filaments', () => {
  it('on one line, touching: M = µ₀/4π · 2 l ln 2 for equal lengths, Grover 1946 (from memory)', () => {
    expect(mutual(onAxis(0, 1), onAxis(1, 2))).toBeCloseTo(2e-7 * Math.LN2, 18)
    expect(mutual(onAxis(0, 1), onAxis(2, 1))).toBeCloseTo(-2e-7 * Math.LN2, 18)
  })

  it('that share a vertex at 60°: by hand, l = m = R = 1 m, M = (µ₀/2π) cos 60° · 2 atanh ½ = 1e-7 ln 3', () => {
    const a: Segment = { start: [0, 0, 0], end: [1, 0, 0] }
    const b: Segment = { start: [0, 0, 0], end: [0.5, Math.sqrt(3) / 2, 0] }
    expect(mutual(a, b) / (1e-7 * Math.log(3))).toBeCloseTo(1, 12)
  })

  it('at a right angle have none', () => {
    const b: Segment = { start: [0.2, 0.1, 0.3], end: [0.2, 0.7, 0.3] }
    expect(Math.abs(mutual(onAxis(0, 1), b))).toBeLessThan(1e-20)
  })

  it('give the same either way round, and change sign when one is turned', () => {
    fc.assert(
      fc.property(segment, segment, (a, b) => {
        const value = mutual(a, b)
        fc.pre(Number.isFinite(value))
        const slack = 1e-9 * Math.abs(value) + 1e-20
        expect(Math.abs(mutual(b, a) - value)).toBeLessThanOrEqual(slack)
        expect(Math.abs(mutual(reversed(a), b) + value)).toBeLessThanOrEqual(slack)
        expect(Math.abs(mutual(reversed(a), reversed(b)) - value)).toBeLessThanOrEqual(slack)
      }),
    )
  })

  it('double when every length doubles, and add up where one is cut in two', () => {
    const scaled = (p: Point3, by: number): Point3 => [by * p[0], by * p[1], by * p[2]]
    fc.assert(
      fc.property(segment, segment, (a, b) => {
        const double = ({ start, end }: Segment): Segment => ({
          start: scaled(start, 2),
          end: scaled(end, 2),
        })
        const value = mutual(a, b)
        fc.pre(Number.isFinite(value))
        expect(Math.abs(mutual(double(a), double(b)) - 2 * value)).toBeLessThan(
          1e-9 * Math.abs(value) + 1e-19,
        )
        const middle: Point3 = [0, 1, 2].map((i) => 0.3 * (a.start[i] ?? 0) + 0.7 * (a.end[i] ?? 0)) as never
        const parts = mutual({ start: a.start, end: middle }, b) + mutual({ start: middle, end: a.end }, b)
        expect(Math.abs(parts - value)).toBeLessThan(1e-9 * Math.abs(value) + 1e-18)
      }),
    )
  })

  it('pass through nearly parallel into parallel without a step', () => {
    const at = (angle: number): number =>
      mutual(onAxis(0, 1), {
        start: [0.3, 0.01, 0.002],
        end: [0.3 + Math.cos(angle), 0.01 + Math.sin(angle), 0.002],
      })
    const parallel = parallelFilaments({
      length1: 1,
      length2: 1,
      distance: Math.hypot(0.01, 0.002),
      offset: 0.3,
    })
    expect(at(0) / parallel).toBeCloseTo(1, 12)
    for (const angle of [1e-13, 1e-10, 1e-7])
      expect(Math.abs(at(angle) / parallel - 1)).toBeLessThan(20 * angle + 1e-11)
    for (const angle of [0.01, 0.02]) {
      expect(Math.abs(at(angle * (1 - 1e-9)) / at(angle * (1 + 1e-9)) - 1)).toBeLessThan(1e-8)
    }
  })

  it('may cross at an angle, where the integral is finite', () => {
    const b: Segment = { start: [0.2, -0.3, 0], end: [0.8, 0.5, 0] }
    const above: Segment = { start: [0.2, -0.3, 1e-9], end: [0.8, 0.5, 1e-9] }
    expect(mutual(onAxis(0, 1), b) / mutual(onAxis(0, 1), above)).toBeCloseTo(1, 6)
  })

  it('are refused where they overlap on one line, have no length, or are no numbers', () => {
    const codeOf = (a: Segment, b: Segment): string | null => {
      const answer = filamentMutual(a, b)
      return answer.ok ? null : answer.error.code
    }
    expect(codeOf(onAxis(0, 1), onAxis(0.5, 2))).toBe('overlap')
    expect(codeOf(onAxis(0, 1), onAxis(0.7, 0.3))).toBe('overlap')
    expect(codeOf({ start: [0, 0, 0], end: [1, 2, 3] }, { start: [0.5, 1, 1.5], end: [2, 4, 6] })).toBe(
      'overlap',
    )
    expect(codeOf(onAxis(0, 0), onAxis(1, 2))).toBe('zero_length')
    expect(codeOf(onAxis(0, Number.NaN), onAxis(1, 2))).toBe('not_finite')
  })
})

describe('parallel filaments', () => {
  it('are by hand for l = d = 1 m: 2e-7 [asinh 1 − √2 + 1]', () => {
    expect(alignedFilaments(1, 1)).toBeCloseTo(2e-7 * (Math.asinh(1) - Math.SQRT2 + 1), 20)
  })

  it('far apart are l m/R, where the four terms of the closed form cancel', () => {
    const pair = { length1: 1e-3, length2: 2e-3, distance: 30, offset: -0.5e-3 }
    expect(parallelFilaments(pair) / ((1e-7 * 2e-6) / 30)).toBeCloseTo(1, 8)
    const tiny = { length1: 1, length2: 1e-9, distance: 1e-3, offset: 0.5 }
    expect(parallelFilaments(tiny) / (1e-7 * 1e-9 * 2 * Math.asinh(500))).toBeCloseTo(1, 8)
  })

  it('on one line are infinite where they overlap, finite where they touch', () => {
    expect(parallelFilaments({ length1: 1, length2: 1, distance: 0, offset: 0.5 })).toBe(Infinity)
    expect(parallelFilaments({ length1: 1, length2: 1, distance: 0, offset: -1 })).toBeCloseTo(
      2e-7 * Math.LN2,
      18,
    )
  })
})
