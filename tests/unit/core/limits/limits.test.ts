import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { distanceRuleAt, levelAtDistance } from '@/lib/core/limits/distance'
import { limitAt, standingWarning } from '@/lib/core/limits/limit-at'
import { findLimitTable, limitTables, limitTitle } from '@/lib/core/limits/limit-tables'
import { upperMeasurementFrequency } from '@/lib/core/limits/upper-frequency'

const at = (id: string, frequency: number): number | string => {
  const table = findLimitTable(id)
  if (!table) return 'no table'
  const limit = limitAt(table, frequency)
  return limit.ok ? Number(limit.value.toFixed(2)) : limit.error.code
}

describe('limits', () => {
  // Source: table of EN 55022 and 47 CFR 18.307(b), public copies.
  it.each([
    ['cispr-32-b-mains-quasi-peak', 150e3, 66],
    ['cispr-32-b-mains-quasi-peak', 250e3, 61.76],
    ['cispr-32-b-mains-quasi-peak', 500e3, 56],
    ['cispr-32-b-mains-quasi-peak', 5e6, 56],
    ['cispr-32-b-mains-quasi-peak', 5.1e6, 60],
    ['cispr-32-b-mains-average', 150e3, 56],
    ['cispr-32-b-mains-average', 30e6, 50],
    ['cispr-32-a-mains-quasi-peak', 500e3, 73],
    ['cispr-32-a-mains-average', 499e3, 66],
    // 47 CFR 15.109 and 15.35, public copies.
    ['fcc-15-109-b-quasi-peak', 88e6, 40],
    ['fcc-15-109-b-quasi-peak', 216e6, 43.52],
    ['fcc-15-109-b-quasi-peak', 960e6, 46.02],
    ['fcc-15-109-b-quasi-peak', 980e6, 53.98],
    ['fcc-15-109-b-peak', 2e9, 73.98],
    ['fcc-15-109-a-quasi-peak', 150e6, 43.52],
    ['fcc-15-109-a-average', 2e9, 49.54],
    // CISPR 32:2012 A.4 and A.5, quoted in a public post.
    ['cispr-32-b-10m-quasi-peak', 230e6, 30],
    ['cispr-32-b-3m-quasi-peak', 231e6, 47],
    ['cispr-32-b-3m-average', 3e9, 50],
    ['cispr-32-b-3m-peak', 4e9, 74],
    // 47 CFR 15.209, public copy: 2400/F(kHz) µV/m at 300 m and 30 µV/m at 30 m.
    ['fcc-15-209-300m-average', 24e3, 40],
    ['fcc-15-209-300m-quasi-peak', 100e3, 27.6],
    ['fcc-15-209-30m-quasi-peak', 10e6, 29.54],
    // MIL-STD-461G CE102, from memory.
    ['mil-std-461g-ce102-28v', 10e3, 94],
    ['mil-std-461g-ce102-28v', 100e3, 73.99],
    ['mil-std-461g-ce102-270v', 1e6, 70],
    // CISPR 25 class 5, from memory: where bands meet, the lower limit.
    ['cispr-25-5-supply-average', 87e6, 18],
    ['cispr-25-5-supply-peak', 45e6, 34],
  ])('%s at %f Hz', (id, frequency, limit) => {
    expect(at(id, frequency)).toBe(limit)
  })

  it('end with their table', () => {
    expect(at('cispr-32-b-mains-quasi-peak', 149e3)).toBe('outside_the_table')
    expect(at('cispr-32-b-mains-quasi-peak', 30.1e6)).toBe('outside_the_table')
    expect(at('cispr-25-5-supply-average', 10e6)).toBe('outside_the_table')
    expect(at('fcc-15-209-300m-quasi-peak', 24e3)).toBe('outside_the_table')
  })

  it('are finite wherever a table has them, and each table has a name and a title of its own', () => {
    expect(new Set(limitTables.map(({ id }) => id)).size).toBe(limitTables.length)
    expect(new Set(limitTables.map(limitTitle)).size).toBe(limitTables.length)
    fc.assert(
      fc.property(
        fc.constantFrom(...limitTables),
        fc.double({ min: 1e3, max: 5e10, noNaN: true }),
        (table, f) => {
          const limit = limitAt(table, f)
          return !limit.ok || Number.isFinite(limit.value)
        },
      ),
    )
  })

  it('carry a warning unless their numbers were read in the document', () => {
    const warning = (id: string) => {
      const table = findLimitTable(id)
      return table ? standingWarning(table) : 'no table'
    }
    expect(warning('fcc-15-109-b-quasi-peak')).toBeNull()
    expect(warning('mil-std-461g-ce102-28v')).toContain('from memory')
    expect(warning('cispr-32-a-10m-quasi-peak')).toContain('from memory')
    expect(warning('cispr-32-b-mains-average')).toContain('related document')
  })
})

describe('the distance of a measurement', () => {
  // Source: 47 CFR 15.31(f), a public copy.
  it('is carried by 20 dB a decade from 30 MHz on and 40 dB below', () => {
    expect(levelAtDistance(40, 3, 10, distanceRuleAt(100e6))).toBeCloseTo(29.542, 3)
    expect(levelAtDistance(70, 3, 30, distanceRuleAt(5e6))).toBeCloseTo(30, 12)
    expect(distanceRuleAt(30e6)).toBe(20)
  })
})

describe('the upper end of a measurement', () => {
  // Source: 47 CFR 15.33(b)(1), a public copy.
  it.each([
    [1e6, 30e6],
    [1.705e6, 1e9],
    [108e6, 1e9],
    [200e6, 2e9],
    [800e6, 5e9],
    [2e9, 10e9],
    [10e9, 40e9],
  ])('of something that uses %f Hz', (highest, until) => {
    expect(upperMeasurementFrequency(highest)).toBe(until)
  })
})
