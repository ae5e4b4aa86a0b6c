import { transformReal } from '../fourier/real-transform'
import { err, ok, type Result } from '../result'
import { levelOfPeak } from '../spectrum/level'
import type { QuasiPeakTimes, ReceiverBand } from './bands'
import { meanOf, peakOf, type EnvelopeCycle } from './envelope-cycle'
import { passedEnvelope } from './passed-envelope'
import { pulseEnvelope } from './pulse-envelope'
import { quasiPeakOf } from './quasi-peak'

/** A sampled voltage that repeats from its end, to be read by a receiver. */
export type MeasuredRecord = {
  readonly values: Float64Array
  /** Between two values, in seconds. */
  readonly interval: number
  /** Pulses per second, where it is known; null where the record repeats as it is. */
  readonly pulseRate: number | null
}

/** Readings in dBµV. */
export type DetectorReadings = {
  readonly peak: number
  readonly average: number
  readonly quasiPeak:
    | { readonly kind: 'simulated'; readonly level: number }
    /** From the peak reading and the pulse rate alone. */
    | { readonly kind: 'estimated'; readonly level: number }
    /** Nothing better than: no more than the peak reading. */
    | { readonly kind: 'at most'; readonly level: number }
  /** How long a record would have to be for a simulated quasi-peak, in seconds; null in a band without one. */
  readonly lengthNeeded: number | null
}

export type DetectorError = {
  readonly code: 'record_too_short' | 'frequency_out_of_range' | 'nothing_there'
  readonly message: string
}

/** A record shows a passband when it lasts so many times the inverse of the bandwidth. */
const fewestBandwidths = 1

/** The record length from which rectifier and meter settle: 3 T_D + 5 T_M. */
export const lengthForQuasiPeak = ({ discharge, meter }: QuasiPeakTimes): number => 3 * discharge + 5 * meter

/**
 * What a receiver of a band, tuned to `frequency`, reads of a measured record: the record goes through two critically
 * coupled stages as if it repeated, and its envelope to the detectors. A quasi-peak is simulated from a record of at least
 * 3 T_D + 5 T_M; from a shorter one it is estimated where the pulse rate is known, and else only bounded by the peak.
 *
 * Errors: a record shorter than the inverse of the bandwidth, a frequency whose passband the sampling does not reach, a
 * passband without anything in it.
 */
export function detectorReadings(
  record: MeasuredRecord,
  frequency: number,
  band: ReceiverBand,
): Result<DetectorReadings, DetectorError> {
  const { values, interval } = record
  const duration = values.length * interval
  if (!(duration * band.bandwidth >= fewestBandwidths)) {
    const message = `A bandwidth of ${band.bandwidth} Hz needs a record of at least ${1 / band.bandwidth} s.`
    return err({ code: 'record_too_short', message })
  }
  if (!(frequency >= 2 * band.bandwidth && frequency + band.bandwidth <= 0.5 / interval)) {
    const message = 'The frequency must lie within the spectrum of the record, two bandwidths above 0.'
    return err({ code: 'frequency_out_of_range', message })
  }
  const cycle = envelopeOf(values, duration, frequency, band)
  const peak = levelOfPeak(peakOf(cycle))
  if (!Number.isFinite(peak)) {
    return err({ code: 'nothing_there', message: 'Nothing is left of the record in this passband.' })
  }
  // A record of several pulses repeats as it is; one of a single pulse is followed by silence.
  const period = Math.max(duration, record.pulseRate === null ? 0 : 1 / record.pulseRate)
  return ok({
    peak,
    average: levelOfPeak(meanOf({ ...cycle, period })),
    quasiPeak: quasiPeakReading(cycle, peak, record.pulseRate, duration, band),
    lengthNeeded: band.quasiPeak === null ? null : lengthForQuasiPeak(band.quasiPeak),
  })
}

function envelopeOf(
  values: Float64Array,
  duration: number,
  frequency: number,
  { bandwidth }: ReceiverBand,
): EnvelopeCycle {
  const spectrum = transformReal(values)
  const last = Math.floor((values.length - 1) / 2)
  const lineAt = (multiple: number): readonly [number, number] => {
    if (multiple < 1 || multiple > last) return [0, 0]
    const scale = 2 / values.length
    return [scale * (spectrum[2 * multiple] ?? 0), scale * (spectrum[2 * multiple + 1] ?? 0)]
  }
  return passedEnvelope(lineAt, 1 / duration, bandwidth, frequency)
}

function quasiPeakReading(
  cycle: EnvelopeCycle,
  peak: number,
  pulseRate: number | null,
  duration: number,
  band: ReceiverBand,
): DetectorReadings['quasiPeak'] {
  const times = band.quasiPeak
  if (times === null) return { kind: 'at most', level: peak }
  if (duration >= lengthForQuasiPeak(times)) {
    return { kind: 'simulated', level: levelOfPeak(quasiPeakOf(cycle, times)) }
  }
  if (pulseRate === null) return { kind: 'at most', level: peak }
  const model = pulseEnvelope(1e-6, band.bandwidth, pulseRate)
  const below = levelOfPeak(peakOf(model)) - levelOfPeak(quasiPeakOf(model, times))
  return { kind: 'estimated', level: peak - below }
}
