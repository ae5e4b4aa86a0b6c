import { describe, expect, it } from 'vitest'

import { clippedSwingsEnd } from '@/lib/core/capture/clipped-swings'
import { findPeriod } from '@/lib/core/capture/find-period'
import { edgeInstants } from '@/lib/core/capture/level-crossing'
import { medianOf } from '@/lib/core/capture/median'
import { repeatedPeriods } from '@/lib/core/capture/repeated-periods'
import { sampleNoise } from '@/lib/core/capture/sample-noise'
import { spreadChoice } from '@/lib/core/capture/spread-choice'
import { twoLevels } from '@/lib/core/capture/two-levels'
import { summariseValues } from '@/lib/core/capture/value-range'
import { randomSource } from '@/lib/core/uncertainty/random'

describe('edgeInstants', () => {
  const view = (values: Float64Array, crossing: number) => ({
    values,
    before: 0,
    after: 1,
    crossing,
    start: 0,
    end: values.length,
    noise: 0,
  })

  it('finds the crossings of a ramp from 10.3 to 14.3 samples at 10.7, 12.3 and 13.9', () => {
    const ramp = Float64Array.from({ length: 30 }, (_, index) => Math.min(1, Math.max(0, (index - 10.3) / 4)))
    const { at10, at50, at90 } = edgeInstants(view(ramp, 13))
    expect(at50).toBeCloseTo(12.3, 6)
    // A cubic through the corner of the ramp is off by a small part of a sample.
    expect(at10).toBeCloseTo(10.7, 0)
    expect(Math.abs(at90 - at10 - 3.2)).toBeLessThan(0.1)
  })

  it('finds those of a smooth edge of four samples within a hundredth of a sample', () => {
    const smooth = (time: number) => 0.5 + 0.5 * Math.tanh(time / 2)
    const values = Float64Array.from({ length: 60 }, (_, index) => smooth(index - 30.37))
    const { at10, at90 } = edgeInstants(view(values, 31))
    expect(Math.abs(at90 - at10 - 4 * Math.atanh(0.8))).toBeLessThan(0.03)
  })
})

describe('findPeriod', () => {
  it('counts over an edge that was not seen, and gives duty and jitter', () => {
    const found = findPeriod({ rising: [0, 10, 20, 40], falling: [3, 13, 23, 33], stride: 1 })
    expect(found).toMatchObject({ period: 10, periods: 4 })
    expect(found?.duty).toBeCloseTo(0.3, 12)
    expect(found?.jitter).toBeCloseTo(0, 12)
  })

  it('finds none where intervals differ, or are fewer than two', () => {
    expect(findPeriod({ rising: [0, 10, 23, 31], falling: [3, 15, 24], stride: 1 })).toBeNull()
    expect(findPeriod({ rising: [0, 10], falling: [3], stride: 1 })).toBeNull()
  })
})

describe('clippedSwingsEnd', () => {
  const ring = (limit: number, step: number) =>
    Float64Array.from({ length: 400 }, (_, index) => {
      const value = Math.exp(-index / 100) * Math.sin((2 * Math.PI * (index + 0.5)) / 40)
      return Math.min(limit, step === 0 ? value : Math.round(value / step) * step)
    })
  const search = { from: 0, to: 400, level: 0, floor: 0.02 }

  it('ends where the last cut-off swing comes back to the level', () => {
    // Crests at e^(−0.1) = 0.90 and e^(−0.5) = 0.61; the third, 0.41, stays below 0.5.
    expect(clippedSwingsEnd(ring(0.5, 0.01), { ...search, step: 0.01 })).toBe(60)
    expect(clippedSwingsEnd(ring(0.7, 0.01), { ...search, step: 0.01 })).toBe(20)
  })

  it('takes no rounded crest for a cut-off one, however coarse the steps', () => {
    for (const step of [0, 0.005, 0.02, 0.05])
      expect(clippedSwingsEnd(ring(2, step), { ...search, step })).toBeNull()
  })
})

describe('twoLevels', () => {
  const levelsOf = (values: Float64Array) => {
    const summary = summariseValues(values)
    return summary === null ? null : twoLevels(values, summary, sampleNoise(values, summary.converterStep))
  }

  it('finds both levels where an overshoot more than doubles the range', () => {
    const values = Float64Array.from({ length: 4000 }, (_, index) =>
      index < 1000 ? 0 : 1 + 1.02 * Math.exp(-(index - 1000) / 300) * Math.cos(index / 5),
    )
    const levels = levelsOf(values)
    expect(levels?.base).toBeCloseTo(0, 2)
    expect(levels?.top).toBeCloseTo(1, 2)
  })

  it('finds one level only in noise, and in the flicker of a converter', () => {
    const random = randomSource(1)
    expect(levelsOf(Float64Array.from({ length: 5000 }, () => random.normal()))).toBeNull()
    expect(
      levelsOf(Float64Array.from({ length: 5000 }, () => Math.round(0.5 + 0.3 * random.normal()))),
    ).toBeNull()
  })
})

describe('sampleNoise', () => {
  it('gives the deviation of the noise whatever edges and slopes lie under it', () => {
    const random = randomSource(2)
    const values = Float64Array.from({ length: 20_000 }, (_, index) => {
      const wave = index % 500 < 200 ? 10 : -10
      return wave + 0.01 * index + 0.3 * random.normal()
    })
    expect(sampleNoise(values, 0)).toBeCloseTo(0.3, 1)
  })

  it('is at least the rounding of the converter', () => {
    expect(sampleNoise(new Float64Array(100), 1)).toBeCloseTo(1 / Math.sqrt(12), 12)
  })
})

describe('small parts', () => {
  it('takes the middle, and the mean of the middle two', () => {
    expect(medianOf([3, 1, 2])).toBe(2)
    expect(medianOf([4, 1, 2, 3])).toBe(2.5)
  })

  it('chooses first and last among many', () => {
    const chosen = spreadChoice([...Array(100).keys()], 5)
    expect(chosen).toEqual([0, 25, 50, 74, 99])
    expect(spreadChoice([1, 2], 5)).toEqual([1, 2])
  })

  it('repeats whole periods, of a length that is no whole number too', () => {
    const values = Float64Array.from({ length: 25 }, (_, index) => Math.sin((2 * Math.PI * index) / 10.5))
    const repeated = repeatedPeriods(values, 10.5, 200)
    expect(repeated).toHaveLength(210)
    repeated?.forEach((value, index) =>
      expect(Math.abs(value - Math.sin((2 * Math.PI * index) / 10.5))).toBeLessThan(0.31),
    )
    expect(repeatedPeriods(values, 30, 100)).toBeNull()
  })
})
