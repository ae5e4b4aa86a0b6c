import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { blackmanHarris4, flatTop5, hann, rectangular } from '@/lib/core/spectrum/cosine-window'
import { findTones, toneNear, type Tone } from '@/lib/core/spectrum/find-tones'
import { amplitudeSpectrum, spectrumLevels } from '@/lib/core/spectrum/record-spectrum'
import { valueOf } from '@/tests/support/value-of'

const interval = 1e-9

type Sine = readonly [frequency: number, peak: number]

const record = (count: number, tones: readonly Sine[], mean = 0): Float64Array =>
  Float64Array.from({ length: count }, (_, n) =>
    tones.reduce((sum, [f, peak]) => sum + peak * Math.cos(2 * Math.PI * f * n * interval + f), mean),
  )

const expectTones = (found: readonly Tone[], expected: readonly Sine[]): void => {
  expect(found).toHaveLength(expected.length)
  expected.forEach(([frequency, peak], index) => {
    expect(Math.abs((found[index]?.frequency ?? 0) / frequency - 1)).toBeLessThan(1e-4)
    expect(Math.abs(20 * Math.log10((found[index]?.amplitude ?? 0) / peak))).toBeLessThan(0.1)
  })
}

describe('the amplitude spectrum of a record', () => {
  it('needs no window where the record holds whole periods', () => {
    const tones = [1, 2, 3, 40].map((h) => [1e6 * h, 1 / h] as const)
    const spectrum = valueOf(amplitudeSpectrum(record(20_000, tones, 12), interval, hann))
    expect(spectrum.isWholePeriods).toBe(true)
    expect(spectrum.window).toBe(rectangular)
    expect(spectrum.binWidth).toBeCloseTo(50e3, 6)
    expect(spectrum.resolutionBandwidth).toBeCloseTo(50e3, 6)
    expect(spectrum.amplitudes[0]).toBeCloseTo(12, 9)
    expect(spectrum.amplitudes[800]).toBeCloseTo(1 / 40, 9)
    // 1 V peak is 116.99 dBµV rms.
    expect(spectrumLevels(spectrum)[20]).toBeCloseTo(116.9897, 4)
    expect(Math.max(...spectrum.amplitudes.subarray(801))).toBeLessThan(1e-9)
  })

  it('uses the window that was asked for otherwise, and states the bandwidth of its bins', () => {
    const spectrum = valueOf(amplitudeSpectrum(record(20_000, [[1.0123e6, 1]]), interval, flatTop5))
    expect(spectrum.isWholePeriods).toBe(false)
    expect(spectrum.window).toBe(flatTop5)
    expect(spectrum.resolutionBandwidth / spectrum.binWidth).toBeCloseTo(3.7702, 4)
    // Within 0.01 dB of the peak value wherever the tone lies between bins.
    expect(20 * Math.log10(Math.max(...spectrum.amplitudes))).toBeCloseTo(0, 1)
  })

  it('leaves the end of a long record of an awkward length out', () => {
    const spectrum = valueOf(amplitudeSpectrum(record(200_003, [[1e6, 1]]), interval, hann))
    expect(spectrum.sampleCount).toBe(200_000)
  })

  it('refuses what gives no spectrum', () => {
    const code = (values: Float64Array, step: number) => {
      const result = amplitudeSpectrum(values, step, hann)
      return result.ok ? 'ok' : result.error.code
    }
    expect(code(new Float64Array(3), interval)).toBe('record_too_short')
    expect(code(new Float64Array(100), 0)).toBe('interval_not_positive')
    expect(code(new Float64Array(100), Number.NaN)).toBe('interval_not_positive')
    expect(code(new Float64Array(100).fill(Infinity, 50), interval)).toBe('value_not_finite')
  })

  it('of a constant is nothing but its mean', () => {
    const spectrum = valueOf(amplitudeSpectrum(new Float64Array(100).fill(5), interval, hann))
    expect(spectrum.amplitudes[0]).toBe(5)
    expect(findTones(spectrum, { floor: 1e-9 })).toEqual([])
  })
})

describe('the tones in a spectrum', () => {
  const tones: readonly Sine[] = [
    [1.03e6, 2],
    [3.0906e6, 0.4],
    [7.7777e6, 0.02],
    [100.0123e6, 0.001],
  ]

  it.each([hann, blackmanHarris4, flatTop5])('are found between bins, over 66 dB: $name', (window) => {
    const spectrum = valueOf(amplitudeSpectrum(record(20_000, tones, 12), interval, window))
    expectTones(findTones(spectrum, { floor: 0.0005 }), tones)
  })

  it('are no side lobes of stronger ones', () => {
    const spectrum = valueOf(amplitudeSpectrum(record(5000, [[10.37e6, 1]]), interval, rectangular))
    expect(findTones(spectrum, { floor: 1e-4 })).toHaveLength(1)
  })

  it('are found wherever they lie, by frequency and level', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20e6, max: 400e6, noNaN: true }),
        fc.double({ min: 1e-3, max: 10, noNaN: true }),
        (frequency, peak) => {
          const values = record(4000, [[frequency, peak]])
          const spectrum = valueOf(amplitudeSpectrum(values, interval, flatTop5))
          expectTones(findTones(spectrum, { floor: peak / 2 }), [[frequency, peak]])
        },
      ),
      { numRuns: 60 },
    )
  })

  it('can be asked for near an expected frequency', () => {
    const spectrum = valueOf(amplitudeSpectrum(record(20_000, tones, 12), interval, hann))
    const near = toneNear(spectrum, 3.1e6, 50e3)
    expect((near?.frequency ?? 0) / 3.0906e6).toBeCloseTo(1, 4)
    expect(toneNear(spectrum, 900e6, 50e3)).toBeNull()
  })
})
