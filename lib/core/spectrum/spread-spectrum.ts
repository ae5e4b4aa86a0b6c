import { coupledStagesBandwidths } from '../receiver/filter-bandwidths'

/** A line whose frequency is swept up and down in a straight triangle; Hz. */
export type SpreadLine = {
  /** From the lowest to the highest frequency of the line: for a harmonic, the harmonic times the width of the clock. */
  readonly width: number
  /** Triangles per second. */
  readonly rate: number
}

/** How much lower a receiver reads a swept line than the steady one, in dB, 0 or more. */
export type SpreadReduction = {
  readonly peak: number
  /** Power in the passband: what an rms detector reads. */
  readonly rms: number
  /** Linear average. */
  readonly average: number
}

/**
 * The effect of spreading a line over a width W at a rate f_m, for a receiver of width B at −6 dB:
 *
 *     c = (4 ln 2/π) 2 W f_m/B²        how much faster the sweep is than the filter
 *     rms      10 lg(W/max(B_noise, f_m))
 *     peak     5 lg(1 + c²), at most that of the rms value
 *     average  20 lg(W/B_imp) − 5 lg(1 + c²), at least that of the rms value
 *
 * Nothing is gained while W ≤ B. A sweep slower than B² passes through the filter at full height, so that only the average
 * falls; a faster one leaves less than its height behind; and a rate above B leaves single lines f_m apart, W/f_m of them.
 * A triangle spends the same time everywhere; a sine lingers at the edges and gains less. Agrees with a transform of the
 * modulated line within 2 dB from W = 3B on. Derived here: response of a Gaussian filter to a straight sweep.
 */
export function spreadReduction({ width, rate }: SpreadLine, b6: number): SpreadReduction {
  if (width <= b6) return { peak: 0, rms: 0, average: 0 }
  const { noise, impulse } = coupledStagesBandwidths(b6)
  const sweep = ((4 * Math.LN2) / Math.PI) * ((2 * width * rate) / b6 ** 2)
  const slowness = 5 * Math.log10(1 + sweep ** 2)
  const rms = Math.max(0, 10 * Math.log10(width / Math.max(noise, rate)))
  return {
    peak: Math.min(slowness, rms),
    rms,
    average: Math.max(rms, 20 * Math.log10(width / impulse) - slowness),
  }
}
