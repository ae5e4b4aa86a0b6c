import { receiverBandAt, type ReceiverBand } from '../receiver/bands'
import { detectorReadings, type DetectorReadings } from '../receiver/detector-readings'
import { err, ok, type Result } from '../result'
import type { Trace } from '../ring/ring-measurement'
import type { CosineWindow } from '../spectrum/cosine-window'
import { amplitudeSpectrum, type AmplitudeSpectrum, type SpectrumError } from '../spectrum/record-spectrum'
import { analyseCapture } from './analyse-capture'
import type { CaptureTone } from './capture-analysis'
import { repeatedPeriods } from './repeated-periods'
import { tonesIn } from './tones-of'

/** What a receiver tuned to a frequency would read of a capture, or why that cannot be told. */
export type ReceiverReading = {
  readonly frequency: number
  readonly band: ReceiverBand
  readonly readings: DetectorReadings
  /** The periods were repeated because the record is shorter than the inverse of the bandwidth. */
  readonly isRepeated: boolean
}

export type CaptureSpectrum = {
  readonly spectrum: AmplitudeSpectrum
  /** Sines above the noise, the strongest first. */
  readonly tones: readonly CaptureTone[]
  /** A sine below this level, in dBµV, cannot be told from the noise. */
  readonly floorLevel: number
  /** Null where no frequency was asked for. */
  readonly reading: ReceiverReading | null
}

export type CaptureSpectrumError = {
  readonly code:
    SpectrumError['code'] | 'nothing_there' | 'outside_bands' | 'record_too_short' | 'frequency_out_of_range'
  readonly message: string
}

/**
 * The amplitude spectrum of a capture in volts under a chosen window: 2|X|/Σw, peak value of a sine, levels in dBµV rms; with
 * its equivalent resolution bandwidth (ENBW of the window times the width of a bin) and the sines above the noise. Tuned to
 * a frequency, also what the peak, average and quasi-peak detectors of CISPR 16-1-1 read there; of a train that is shorter
 * than the inverse of their bandwidth, its whole periods are repeated.
 */
export function captureSpectrum(
  trace: Trace,
  window: CosineWindow,
  tuned: number | null,
): Result<CaptureSpectrum, CaptureSpectrumError> {
  const spectrum = amplitudeSpectrum(trace.values, trace.intervalSeconds, window)
  if (!spectrum.ok) return spectrum
  const found = tonesIn(spectrum.value)
  if (found === null) return err(nothingThere)
  const read = tuned === null ? ok(null) : receiverReading(trace, tuned)
  if (!read.ok) return read
  const tones = [...found.list].sort((a, b) => b.amplitude - a.amplitude)
  return ok({ spectrum: spectrum.value, tones, floorLevel: found.floorLevel, reading: read.value })
}

function receiverReading(trace: Trace, frequency: number): Result<ReceiverReading, CaptureSpectrumError> {
  const band = receiverBandAt(frequency)
  if (band === null) return err(outsideBands)
  const { values, startSeconds, intervalSeconds } = trace
  const analysed = analyseCapture(values, startSeconds, intervalSeconds)
  const period = analysed.ok ? (analysed.value.states?.period ?? null) : null
  const isShort = values.length * intervalSeconds * band.bandwidth < 1
  const repeated =
    isShort && period !== null
      ? repeatedPeriods(values, period.seconds / intervalSeconds, 1 / (band.bandwidth * intervalSeconds))
      : null
  const record = {
    values: repeated ?? values,
    interval: intervalSeconds,
    pulseRate: period === null ? null : period.fundamental,
  }
  const readings = detectorReadings(record, frequency, band)
  if (!readings.ok) return readings
  return ok({ frequency, band, readings: readings.value, isRepeated: repeated !== null })
}

const nothingThere: CaptureSpectrumError = {
  code: 'nothing_there',
  message: 'No sine stands above the noise of this record; choose a longer window, or another channel.',
}

const outsideBands: CaptureSpectrumError = {
  code: 'outside_bands',
  message: 'A receiver has bands from 9 kHz to 18 GHz; choose a frequency among them.',
}
