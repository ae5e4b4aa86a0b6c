import { describe, expect, it } from 'vitest'

import { receiverBands } from '@/lib/core/receiver/bands'
import { detectorReadings, lengthForQuasiPeak } from '@/lib/core/receiver/detector-readings'
import { pulseResponse } from '@/lib/core/receiver/pulse-response'
import { levelOfPeak } from '@/lib/core/spectrum/level'
import { valueOf } from '@/tests/support/value-of'

const { B } = receiverBands

/** Pulses of one value each, so that the spectrum is flat. */
function pulses(interval: number, duration: number, rate: number, area: number): Float64Array {
  const values = new Float64Array(Math.round(duration / interval))
  for (let at = 0; at * interval < duration - interval / 2; at += Math.round(1 / rate / interval)) {
    values[at] = area / interval
  }
  return values
}

describe('what a receiver reads of a record', () => {
  it('is the level of a sine in every detector', () => {
    const values = Float64Array.from(
      { length: 20_000 },
      (_, n) => 0.01 * Math.cos(2 * Math.PI * 1e6 * n * 1e-7),
    )
    const read = valueOf(detectorReadings({ values, interval: 1e-7, pulseRate: null }, 1e6, B))
    expect(read.peak).toBeCloseTo(levelOfPeak(0.01), 3)
    expect(read.average).toBeCloseTo(levelOfPeak(0.01), 3)
    expect(read.quasiPeak).toMatchObject({ kind: 'at most' })
  })

  it('is that of the pulse train it shows, once it is long enough', () => {
    const duration = 1.3
    expect(duration).toBeGreaterThan(lengthForQuasiPeak(B.quasiPeak ?? missing))
    const values = pulses(1e-6, duration, 100, 1e-6)
    const read = valueOf(detectorReadings({ values, interval: 1e-6, pulseRate: null }, 200e3, B))
    const model = valueOf(pulseResponse(B, { area: 1e-6, rate: 100 }))
    expect(read.quasiPeak.kind).toBe('simulated')
    expect(read.peak).toBeCloseTo(model.peak, 1)
    expect(read.average).toBeCloseTo(model.average ?? NaN, 1)
    expect(read.quasiPeak.level).toBeCloseTo(model.quasiPeak, 0)
  })

  it('is estimated from the pulse rate where the record holds one pulse', () => {
    const values = pulses(1e-6, 2e-3, 100, 1e-6)
    const read = valueOf(detectorReadings({ values, interval: 1e-6, pulseRate: 100 }, 200e3, B))
    const model = valueOf(pulseResponse(B, { area: 1e-6, rate: 100 }))
    expect(read.quasiPeak.kind).toBe('estimated')
    expect(read.quasiPeak.level).toBeCloseTo(model.quasiPeak, 1)
    expect(read.average).toBeCloseTo(model.average ?? NaN, 1)
    expect(read.lengthNeeded).toBeCloseTo(1.28, 9)
  })

  it('is refused for a record that shows nothing of the passband', () => {
    const code = (count: number, frequency: number) => {
      const result = detectorReadings(
        { values: new Float64Array(count), interval: 1e-7, pulseRate: null },
        frequency,
        B,
      )
      return result.ok ? 'ok' : result.error.code
    }
    expect(code(100, 1e6)).toBe('record_too_short')
    expect(code(20_000, 6e6)).toBe('frequency_out_of_range')
    expect(code(20_000, 1e3)).toBe('frequency_out_of_range')
    expect(code(20_000, 1e6)).toBe('nothing_there')
  })
})

const missing = {
  charge: 0,
  discharge: 0,
  meter: 0,
  standing: 'from memory',
  meterStanding: 'from memory',
} as const
