import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import {
  decadeOf,
  nearestByDifference,
  nearestByRatio,
  neighboursOf,
  seriesNames,
} from '@/lib/core/parts/preferred-values'

const value = fc.double({ min: -15, max: 15, noNaN: true }).map((power) => 10 ** power)
const series = fc.constantFrom(...seriesNames)

describe('preferred values', () => {
  it('stand below and above, and the nearest is one of the two', () => {
    fc.assert(
      fc.property(value, series, (v, name) => {
        const { below, above } = neighboursOf(v, name)
        expect(below).toBeLessThanOrEqual(v * (1 + 1e-8))
        expect(above).toBeGreaterThanOrEqual(v * (1 - 1e-8))
        expect([below, above]).toContain(nearestByRatio(v, name))
        expect([below, above]).toContain(nearestByDifference(v, name))
      }),
    )
  })

  it('read back as themselves, in every decade', () => {
    fc.assert(
      fc.property(fc.integer({ min: -12, max: 9 }), series, fc.nat(), (decade, name, pick) => {
        const values = decadeOf(name)
        const own = Number(`${values[pick % values.length] ?? 100}e${decade}`)
        expect(neighboursOf(own, name)).toEqual({ below: own, above: own })
        expect(nearestByRatio(own, name)).toBe(own)
      }),
    )
  })

  it('rise with the value', () => {
    fc.assert(
      fc.property(value, fc.double({ min: 1, max: 10, noNaN: true }), series, (v, factor, name) => {
        expect(nearestByRatio(v * factor, name)).toBeGreaterThanOrEqual(nearestByRatio(v, name))
      }),
    )
  })

  // IEC 60063 (from memory): the two values that rounding alone does not give.
  it('hold 920 in E192 and no 919, and 82 in E24', () => {
    expect(decadeOf('E192')).toContain(920)
    expect(decadeOf('E192')).not.toContain(919)
    expect(decadeOf('E24')).toContain(820)
  })

  it('wrap into the next decade', () => {
    expect(nearestByRatio(9.76, 'E24')).toBe(10)
    expect(nearestByRatio(9.9e-12, 'E96')).toBe(10e-12)
  })

  it('differ in their two meanings of nearest at 1.049', () => {
    expect(nearestByRatio(1.049, 'E24')).toBe(1.1)
    expect(nearestByDifference(1.049, 'E24')).toBe(1)
  })
})
