import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { receiverBandAt, receiverBands } from '@/lib/core/receiver/bands'
import { coupledStagesBandwidths } from '@/lib/core/receiver/filter-bandwidths'
import { pulseResponse } from '@/lib/core/receiver/pulse-response'
import { levelOfRms } from '@/lib/core/spectrum/level'
import { valueOf } from '@/tests/support/value-of'

// Level for a constant indication relative to the reference rate, in dB, so that the reading has the opposite sign.
// Source: pulse response of CISPR 16-1-1, from memory. A rate of null is a single pulse.
const published = [
  ['A', 100, -4],
  ['A', 60, -3],
  ['A', 25, 0],
  ['A', 10, 4],
  ['A', 5, 7.5],
  ['A', 2, 13],
  ['A', 1, 17],
  ['A', null, 19],
  ['B', 1000, -4.5],
  ['B', 100, 0],
  ['B', 20, 6.5],
  ['B', 10, 10],
  ['B', 2, 20.5],
  ['B', 1, 22.5],
  ['B', null, 23.5],
  ['C', 1000, -8],
  ['C', 100, 0],
  ['C', 20, 9],
  ['C', 10, 14],
  ['C', 2, 26],
  ['C', 1, 28.5],
  ['C', null, 31.5],
] as const

describe('the quasi-peak reading of pulses', () => {
  it.each(published)('band %s at %s pulses per second: %s dB within 1.5 dB', (id, rate, level) => {
    const { relative } = valueOf(pulseResponse(receiverBands[id], { area: 1e-6, rate }))
    expect(Math.abs(-relative - level)).toBeLessThan(1.5)
  })

  // Source: the absolute reference of CISPR 16-1-1, from memory.
  it.each([
    ['A', 13.5e-6, 25],
    ['B', 0.316e-6, 100],
    ['C', 0.044e-6, 100],
    ['D', 0.044e-6, 100],
  ] as const)('band %s: pulses of %s Vs at %s Hz read like a sine of 66 dBµV', (id, area, rate) => {
    const { quasiPeak } = valueOf(pulseResponse(receiverBands[id], { area, rate }))
    expect(Math.abs(quasiPeak - 66)).toBeLessThan(1)
  })

  it('lies between average and peak, and rises with the rate', () => {
    const rate = fc.double({ min: 1, max: 5e4, noNaN: true })
    fc.assert(
      fc.property(fc.constantFrom('A', 'B', 'C'), rate, (id, pulses) => {
        const band = receiverBands[id as 'A' | 'B' | 'C']
        const read = valueOf(pulseResponse(band, { area: 1e-6, rate: pulses }))
        expect(read.quasiPeak).toBeLessThanOrEqual(read.peak + 0.01)
        expect(read.quasiPeak).toBeGreaterThanOrEqual((read.average ?? -Infinity) - 0.01)
        const faster = valueOf(pulseResponse(band, { area: 1e-6, rate: 1.3 * pulses }))
        if (pulses < band.bandwidth / 20) expect(faster.quasiPeak).toBeGreaterThan(read.quasiPeak)
      }),
      { numRuns: 40 },
    )
  })

  it('of pulses much faster than the bandwidth is that of the one line that is left, in every detector', () => {
    const read = valueOf(pulseResponse(receiverBands.B, { area: 1e-9, rate: 1e6 }))
    const line = levelOfRms(Math.SQRT2 * 1e-9 * 1e6)
    for (const level of [read.peak, read.quasiPeak, read.average]) expect(level).toBeCloseTo(line, 2)
  })

  it('moves with the area of the pulses, dB for dB', () => {
    const one = valueOf(pulseResponse(receiverBands.B, { area: 1e-7, rate: 100 }))
    const ten = valueOf(pulseResponse(receiverBands.B, { area: 1e-6, rate: 100 }))
    expect(ten.quasiPeak - one.quasiPeak).toBeCloseTo(20, 6)
    expect(ten.peak - one.peak).toBeCloseTo(20, 6)
  })

  it('peak is √2 S B_imp', () => {
    const { peak } = valueOf(pulseResponse(receiverBands.B, { area: 0.316e-6, rate: 100 }))
    const { impulse } = coupledStagesBandwidths(9e3)
    expect(peak).toBeCloseTo(levelOfRms(Math.SQRT2 * 0.316e-6 * impulse), 2)
  })
})

describe('what has no pulse response', () => {
  it('is refused with what is wrong', () => {
    const code = (...args: Parameters<typeof pulseResponse>) => {
      const result = pulseResponse(...args)
      return result.ok ? 'ok' : result.error.code
    }
    expect(code(receiverBands.E, { area: 1e-6, rate: 100 })).toBe('no_quasi_peak')
    expect(code(receiverBands.B, { area: 0, rate: 100 })).toBe('pulses_out_of_range')
    expect(code(receiverBands.B, { area: 1e-6, rate: 0 })).toBe('pulses_out_of_range')
    expect(code(receiverBands.B, { area: 1e-6, rate: 1e9 })).toBe('pulses_out_of_range')
    expect(code(receiverBands.B, { area: Number.NaN, rate: 100 })).toBe('pulses_out_of_range')
    expect(code(receiverBands.B, { area: 1e-6, rate: 100 }, 120e3)).toBe('bandwidth_out_of_range')
  })
})

describe('the band of a frequency', () => {
  it('is the lower one at an edge, and none outside', () => {
    expect(receiverBandAt(150e3)?.id).toBe('A')
    expect(receiverBandAt(30e6)?.id).toBe('B')
    expect(receiverBandAt(31e6)?.id).toBe('C')
    expect(receiverBandAt(1e3)).toBeNull()
    expect(receiverBandAt(20e9)).toBeNull()
  })
})
