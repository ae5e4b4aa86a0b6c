import { longestSmoothLength } from '../fourier/radices'
import { err, ok, type Result } from '../result'
import { rectangular, type CosineWindow } from './cosine-window'
import { dftAmplitudes } from './dft-amplitude'
import { levelOfPeak } from './level'
import { spansWholePeriods } from './whole-periods'
import { windowFigures } from './window-response'

/** The amplitude spectrum of a sampled record; every amplitude is the peak value of a sine. */
export type AmplitudeSpectrum = {
  /** In the unit of the record, from 0 Hz in steps of `binWidth`. The mean of the record is in bin 0 and nowhere else. */
  readonly amplitudes: Float64Array
  /** In Hz. */
  readonly binWidth: number
  /** Equivalent noise bandwidth of a bin, in Hz: what to compare with the RBW of a receiver. */
  readonly resolutionBandwidth: number
  /** The window that was used. */
  readonly window: CosineWindow
  /** How many values were used: the end of a long record of an awkward length is left out. */
  readonly sampleCount: number
  /** Whether every strong tone falls on a bin, as it does when the record holds whole periods. */
  readonly isWholePeriods: boolean
}

export type SpectrumError = {
  readonly code: 'record_too_short' | 'interval_not_positive' | 'value_not_finite'
  readonly message: string
}

/** Below this many values any length is taken as it is. */
const longestExact = 2 ** 17

/** Fewer than this many values show nothing of a spectrum. */
const fewestValues = 16

/**
 * The amplitude spectrum of a record of equally spaced values: mean removed, windowed, 2|X|/Σw.
 *
 * A record that holds whole periods of everything strong in it needs no window and gets none (rectangular); otherwise
 * `window` is used. Amplitudes are exact for tones on a bin and low by at most the scallop loss between two. Errors: too
 * few values, an interval that is not above 0, a value that is not finite.
 */
export function amplitudeSpectrum(
  values: Float64Array,
  intervalSeconds: number,
  window: CosineWindow,
): Result<AmplitudeSpectrum, SpectrumError> {
  const problem = problemOf(values, intervalSeconds)
  if (problem !== null) return err(problem)
  const sampleCount = values.length > longestExact ? longestSmoothLength(values.length) : values.length
  const record = values.subarray(0, sampleCount)
  const mean = record.reduce((sum, value) => sum + value, 0) / sampleCount
  const swing = record.map((value) => value - mean)
  const plain = dftAmplitudes(swing, rectangular.coefficients)
  const isWholePeriods = spansWholePeriods(plain)
  const used = isWholePeriods ? rectangular : window
  const amplitudes = used.coefficients.length === 1 ? plain : dftAmplitudes(swing, used.coefficients)
  amplitudes[0] = Math.abs(mean)
  const binWidth = 1 / (sampleCount * intervalSeconds)
  const noiseBandwidth = windowFigures(used.coefficients)?.noiseBandwidth ?? 1
  return ok({
    amplitudes,
    binWidth,
    resolutionBandwidth: noiseBandwidth * binWidth,
    window: used,
    sampleCount,
    isWholePeriods,
  })
}

/** The amplitudes of a voltage record as levels in dBµV (rms, as a receiver shows a sine); nothing below −200 dBµV. */
export const spectrumLevels = ({ amplitudes }: AmplitudeSpectrum): Float64Array =>
  amplitudes.map((peak) => (peak > 0 ? Math.max(-200, levelOfPeak(peak)) : -200))

function problemOf(values: Float64Array, intervalSeconds: number): SpectrumError | null {
  if (values.length < fewestValues) {
    const message = `A spectrum needs at least ${fewestValues} values; the record has ${values.length}.`
    return { code: 'record_too_short', message }
  }
  if (!(intervalSeconds > 0) || !Number.isFinite(intervalSeconds)) {
    const message = 'The time between two values must be more than 0 s.'
    return { code: 'interval_not_positive', message }
  }
  const broken = values.findIndex((value) => !Number.isFinite(value))
  if (broken === -1) return null
  return { code: 'value_not_finite', message: `Value ${broken + 1} of the record is not a finite number.` }
}
