import { describe, expect, it } from 'vitest'

import { captureSpectrum, type CaptureSpectrum } from '@/lib/core/capture/capture-spectrum'
import { captureSpectrumFigure } from '@/lib/core/capture/capture-spectrum-figure'
import {
  captureSpectrumLines,
  captureSpectrumMethod,
  captureSpectrumResults,
} from '@/lib/core/capture/capture-spectrum-method'
import { flatTop5, hann, type CosineWindow } from '@/lib/core/spectrum/cosine-window'
import { levelOfPeak } from '@/lib/core/spectrum/level'

import { sampled, sampledTrain, type RingingTrain } from '../../../../lib/commands/benches/ringing-train'
import { harmonicTruth } from '../../../fixtures/ringing-truth'

const interval = 10e-9

function spectrumOf(
  values: Float64Array,
  window: CosineWindow,
  tuned: number | null = null,
): CaptureSpectrum {
  const result = captureSpectrum({ values, startSeconds: 0, intervalSeconds: interval }, window, tuned)
  if (!result.ok) throw new Error(result.error.message)
  return result.value
}

const sineOf = (frequency: number, peak: number, count: number) =>
  sampled((time) => peak * Math.cos(2 * Math.PI * frequency * time), {
    start: 0,
    interval,
    count,
    noise: 1e-5,
    step: 0,
    seed: 1,
  })

const valueOf = (spectrum: CaptureSpectrum, key: string) =>
  captureSpectrumResults(spectrum).find((result) => result.key === key)

describe('the spectrum of a capture', () => {
  it('shows 1 V rms as 120 dBµV under any window, between bins too', () => {
    const sine = sineOf(1.0003e6, Math.SQRT2, 20_000)
    for (const window of [flatTop5, hann]) {
      const { tones } = spectrumOf(sine, window)
      expect(tones[0]?.level).toBeCloseTo(120, 2)
      expect(tones[0]?.frequency).toBeCloseTo(1.0003e6, -1)
    }
  })

  it('states the equivalent resolution bandwidth, ENBW · f_s/N: 1.5 · 5 kHz and 3.7702 · 5 kHz', () => {
    const sine = sineOf(1.0003e6, 1, 20_000)
    expect(spectrumOf(sine, hann).spectrum.resolutionBandwidth).toBeCloseTo(7500, 6)
    expect(spectrumOf(sine, flatTop5).spectrum.resolutionBandwidth).toBeCloseTo(3.7702 * 5000, 0)
  })

  it('refuses silence, and a frequency outside the bands of receivers, with a sentence', () => {
    const trace = { values: new Float64Array(1000), startSeconds: 0, intervalSeconds: interval }
    expect(captureSpectrum(trace, hann, null)).toMatchObject({ ok: false, error: { code: 'nothing_there' } })
    const sine = { ...trace, values: sineOf(1e6, 1, 20_000) }
    expect(captureSpectrum(sine, hann, 5e3)).toMatchObject({ ok: false, error: { code: 'outside_bands' } })
  })
})

describe('what a receiver reads of a capture', () => {
  const train: RingingTrain = {
    base: 0,
    top: 12,
    period: 2.5e-6,
    width: 0.7e-6,
    riseTime: 60e-9,
    fallTime: 60e-9,
    network: null,
  }
  const recordOf = (count: number) =>
    sampledTrain(train, { start: 0, interval, count, noise: 0.01, step: 0, seed: 3 })

  it('reads a line of a train the same with all detectors: its lines lie 400 kHz apart, the band takes in 9 kHz', () => {
    const { reading } = spectrumOf(recordOf(50_000), flatTop5, 2e6)
    const expected = levelOfPeak(harmonicTruth(train, 5))
    expect(reading).toMatchObject({ band: { id: 'B' }, isRepeated: false })
    expect(reading?.readings.peak).toBeCloseTo(expected, 1)
    expect(reading?.readings.average).toBeCloseTo(expected, 1)
    expect(reading?.readings.quasiPeak).toMatchObject({
      kind: 'estimated',
      level: expect.closeTo(expected, 1),
    })
  })

  it('repeats the periods of a record shorter than the inverse of the bandwidth', () => {
    const { reading } = spectrumOf(recordOf(5000), flatTop5, 2e6)
    expect(reading?.isRepeated).toBe(true)
    expect(reading?.readings.peak).toBeCloseTo(levelOfPeak(harmonicTruth(train, 5)), 0)
  })

  it('refuses a short record that repeats nothing', () => {
    const trace = { values: sineOf(2e6, 1, 5000), startSeconds: 0, intervalSeconds: interval }
    expect(captureSpectrum(trace, hann, 2e6)).toMatchObject({
      ok: false,
      error: { code: 'record_too_short' },
    })
  })

  it('calls a quasi-peak of a record that repeats nothing at most the peak', () => {
    const spectrum = spectrumOf(sineOf(2.0003e6, 1, 50_000), hann, 2e6)
    expect(valueOf(spectrum, 'quasiPeak')?.label).toBe('Quasi-peak, at most')
    expect(valueOf(spectrum, 'quasiPeak')?.value).toBe(valueOf(spectrum, 'peak')?.value)
  })
})

describe('the method of the spectrum of a capture', () => {
  const spectrum = spectrumOf(sineOf(1.0003e6, 1, 200_000), hann)

  it('lists its lines and draws no more points than a figure can show, the strongest among them', () => {
    expect(captureSpectrumLines(spectrum).rows[0]?.[2]).toBeCloseTo(levelOfPeak(1), 2)
    const figure = captureSpectrumFigure(spectrum)
    const [levels] = figure.series
    expect(levels?.x.length).toBeLessThanOrEqual(800)
    // The line lies between two bins: the drawn one is low by the scallop loss of the window at most, 1.42 dB.
    const highest = Math.max(...(levels?.y ?? []))
    expect(highest).toBeLessThan(levelOfPeak(1))
    expect(highest).toBeGreaterThan(levelOfPeak(1) - 1.43)
    expect(figure.description).toContain('The strongest lies at 1.000\u00A0MHz')
  })

  it('offers every window, and is named for runs and reports', () => {
    expect(captureSpectrumMethod).toMatchObject({ id: 'capture-spectrum', version: 1 })
    expect(Object.keys(captureSpectrumMethod.inputs.window.options)).toContain('flat-top-5')
  })
})
