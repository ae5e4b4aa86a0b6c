import { err, ok, type Result } from '../result'
import { levelOfPeak } from '../spectrum/level'
import type { ReceiverBand } from './bands'
import { meanOf, peakOf } from './envelope-cycle'
import { pulseEnvelope } from './pulse-envelope'
import { quasiPeakOf } from './quasi-peak'

/** A train of pulses much shorter than 1/bandwidth, or a single one. */
export type Pulses = {
  /** Area of a pulse, in volt-seconds. */
  readonly area: number
  /** Pulses per second; null for a single pulse. */
  readonly rate: number | null
}

/** Readings in dBµV; the average of a single pulse has no level. */
export type PulseReadings = {
  readonly peak: number
  readonly quasiPeak: number
  readonly average: number | null
  /** The quasi-peak reading above that of the same pulses at the reference rate of the band, in dB. */
  readonly relative: number
}

export type PulseResponseError = {
  readonly code: 'no_quasi_peak' | 'bandwidth_out_of_range' | 'pulses_out_of_range'
  readonly message: string
}

/** The detector model is that of one bandwidth; it is used up to so many times away from it. */
const farthestBandwidth = 10

/** Rates up to so many times the bandwidth: far above, only one steady line is left. */
const fastestRate = 1000

/**
 * What a CISPR 16-1-1 receiver reads of pulses: peak √2 S B_imp, average the mean of the envelope, quasi-peak by simulating
 * rectifier and meter. Tuned to a harmonic of the rate, with a spectrum that is flat over the passband; below the reference
 * rate the readings agree with the published pulse response within 0.7 dB, at 1 Hz in bands C and D within 1.5 dB.
 *
 * Errors: a band without quasi-peak, a bandwidth over ten times away from that of the band, an area or rate not above 0 or
 * a rate above a thousand bandwidths.
 */
export function pulseResponse(
  band: ReceiverBand,
  { area, rate }: Pulses,
  bandwidth: number = band.bandwidth,
): Result<PulseReadings, PulseResponseError> {
  const { quasiPeak: times, referenceRate } = band
  if (times === null || referenceRate === null) {
    return err({ code: 'no_quasi_peak', message: `Band ${band.id} has no quasi-peak detector.` })
  }
  if (!(bandwidth * farthestBandwidth >= band.bandwidth && bandwidth <= farthestBandwidth * band.bandwidth)) {
    const message = `The time constants of band ${band.id} belong to ${band.bandwidth} Hz; this bandwidth is over ten times away.`
    return err({ code: 'bandwidth_out_of_range', message })
  }
  const problem = problemOf(area, rate, bandwidth)
  if (problem !== null) return err({ code: 'pulses_out_of_range', message: problem })
  const cycle = pulseEnvelope(area, bandwidth, rate ?? 0)
  const quasiPeak = levelOfPeak(quasiPeakOf(cycle, times))
  const reference = levelOfPeak(quasiPeakOf(pulseEnvelope(area, bandwidth, referenceRate), times))
  return ok({
    peak: levelOfPeak(peakOf(cycle)),
    quasiPeak,
    average: rate === null ? null : levelOfPeak(meanOf(cycle)),
    relative: quasiPeak - reference,
  })
}

function problemOf(area: number, rate: number | null, bandwidth: number): string | null {
  if (!(area > 1e-15 && area < 1e3)) return 'The area of a pulse must be more than 1 fVs and below 1000 Vs.'
  if (rate === null) return null
  if (!(rate >= 0.01)) return 'Pulses more than 100 s apart are single pulses.'
  if (rate > fastestRate * bandwidth) return 'Above a thousand bandwidths the pulses are one steady sine.'
  return null
}
