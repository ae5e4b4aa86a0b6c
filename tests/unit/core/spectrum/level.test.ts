import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import {
  currentOfLevel,
  levelOfCurrent,
  levelOfPeak,
  levelOfPower,
  levelOfRms,
} from '@/lib/core/spectrum/level'
import { peakOfLevel, powerOfLevel, rmsOfLevel } from '@/lib/core/spectrum/level'

// Source: the definitions, worked by hand.
describe('levels in dB', () => {
  it('of 1 mW in 50 Ω are 106.99 dBµV and 73.01 dBµA', () => {
    expect(levelOfPower(0)).toBeCloseTo(106.9897, 4)
    expect(currentOfLevel(levelOfPower(0))).toBeCloseTo(73.0103, 4)
    expect(levelOfCurrent(0)).toBeCloseTo(33.9794, 4)
  })

  it('of field strengths are those of the rules: 100, 150, 200, 500 µV/m', () => {
    const levels = [100, 150, 200, 500].map((field) => levelOfRms(field * 1e-6))
    expect(levels.map((level) => level.toFixed(2))).toEqual(['40.00', '43.52', '46.02', '53.98'])
  })

  it('come back, in any impedance', () => {
    const level = fc.double({ min: -100, max: 200, noNaN: true })
    const resistance = fc.double({ min: 0.1, max: 1e4, noNaN: true })
    fc.assert(
      fc.property(level, resistance, (db, ohms) => {
        expect(levelOfRms(rmsOfLevel(db))).toBeCloseTo(db, 9)
        expect(levelOfPeak(peakOfLevel(db))).toBeCloseTo(db, 9)
        expect(powerOfLevel(levelOfPower(db, ohms), ohms)).toBeCloseTo(db, 9)
        expect(currentOfLevel(levelOfCurrent(db, ohms), ohms)).toBeCloseTo(db, 9)
      }),
    )
  })
})
