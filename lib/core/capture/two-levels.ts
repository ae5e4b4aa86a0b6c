import type { StateLevels } from '../ring/ring-measurement'
import type { ValueSummary } from './value-range'

const bins = 512

/** Two levels lie at least this part of the range apart. */
const apart = 0.1

/** Samples this close to a mode, as a part of the range, belong to its level. */
const nearMode = 0.015

/** Two levels closer than so many deviations of the noise, or steps of the converter, are one. */
const leastDeviations = 6
const leastSteps = 3

/**
 * The two levels at which a record is most often: modes of its histogram at least a tenth of the range apart, each refined
 * to the mean of the samples near it, so that noise and the steps of the converter average out. Base is the low one. Null
 * where the two are one within the noise.
 *
 * Unlike modes of the lower and the upper half of the range, they stay right where an overshoot doubles the range.
 * Method: histogram modes, IEEE Std 181-2011, clause on state levels.
 */
export function twoLevels(values: Float64Array, summary: ValueSummary, noise: number): StateLevels | null {
  const range = summary.maximum - summary.minimum
  if (!(range > 0)) return null
  const counts = histogramOf(values, summary.minimum, range)
  const first = modeOf(counts, () => true)
  const second = modeOf(counts, (bin) => Math.abs(bin - first) >= apart * bins)
  const centreOf = (bin: number) => summary.minimum + ((bin + 0.5) / bins) * range
  const reach = Math.max(nearMode * range, 3 * noise)
  const levels = [first, second].map((bin) => meanNear(values, centreOf(bin), reach)).sort((a, b) => a - b)
  const [base = 0, top = 0] = levels
  const least = Math.max(leastDeviations * noise, leastSteps * summary.converterStep)
  return top - base >= least ? { base, top } : null
}

function histogramOf(values: Float64Array, minimum: number, range: number): Float64Array {
  const counts = new Float64Array(bins)
  const scale = bins / range
  for (const value of values) {
    const bin = Math.min(bins - 1, ((value - minimum) * scale) | 0)
    counts[bin] = (counts[bin] ?? 0) + 1
  }
  // Three bins together, so that a level between two of them counts as much as one within.
  return counts.map((count, bin) => count + ((counts[bin - 1] ?? 0) + (counts[bin + 1] ?? 0)) / 2)
}

function modeOf(counts: Float64Array, isAllowed: (bin: number) => boolean): number {
  let mode = -1
  counts.forEach((count, bin) => {
    if (isAllowed(bin) && (mode < 0 || count > (counts[mode] ?? 0))) mode = bin
  })
  return mode
}

/** The mean of the samples near a mode; a second pass starts from the first one's mean. */
function meanNear(values: Float64Array, mode: number, reach: number): number {
  let centre = mode
  for (let pass = 0; pass < 2; pass += 1) {
    let sum = 0
    let count = 0
    for (const value of values) {
      const away = value - centre
      if (away > reach || away < -reach) continue
      sum += away
      count += 1
    }
    if (count > 0) centre += sum / count
  }
  return centre
}
