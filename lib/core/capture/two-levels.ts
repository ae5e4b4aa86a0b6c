import type { StateLevels } from '../ring/ring-measurement'
import type { ValueSummary } from './value-range'

/** Bins for the modes, and how many finer ones in each for the mean around a mode. */
const bins = 512
const finer = 16

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
  const histogram = histogramOf(values, summary.minimum, range)
  const counts = coarseCounts(histogram)
  const first = modeOf(counts, () => true)
  const second = modeOf(counts, (bin) => Math.abs(bin - first) >= apart * bins)
  const reach = Math.max(nearMode, (3 * noise) / range) * bins * finer
  const [base = 0, top = 0] = [first, second]
    .map((bin) => summary.minimum + meanNear(histogram, (bin + 0.5) * finer, reach))
    .sort((a, b) => a - b)
  const least = Math.max(leastDeviations * noise, leastSteps * summary.converterStep)
  return top - base >= least ? { base, top } : null
}

/** How many samples are in a bin, and the sum of how far they lie above the minimum. */
type Histogram = { readonly counts: Float64Array; readonly sums: Float64Array }

function histogramOf(values: Float64Array, minimum: number, range: number): Histogram {
  const size = bins * finer
  const counts = new Float64Array(size)
  const sums = new Float64Array(size)
  const scale = size / range
  for (let index = 0; index < values.length; index += 1) {
    const above = (values[index] ?? 0) - minimum
    const bin = Math.min(size - 1, (above * scale) | 0)
    counts[bin] = (counts[bin] ?? 0) + 1
    sums[bin] = (sums[bin] ?? 0) + above
  }
  return { counts, sums }
}

/** A bin with half of each of its neighbours, so that a level between two of them counts as much as one within. */
function coarseCounts({ counts }: Histogram): Float64Array {
  const plain = new Float64Array(bins)
  counts.forEach((count, index) => {
    const bin = Math.floor(index / finer)
    plain[bin] = (plain[bin] ?? 0) + count
  })
  return plain.map((count, bin) => count + ((plain[bin - 1] ?? 0) + (plain[bin + 1] ?? 0)) / 2)
}

function modeOf(counts: Float64Array, isAllowed: (bin: number) => boolean): number {
  let mode = -1
  counts.forEach((count, bin) => {
    if (isAllowed(bin) && (mode < 0 || count > (counts[mode] ?? 0))) mode = bin
  })
  return mode
}

/**
 * The mean of the samples within `reach` bins of a mode, above the minimum; later passes start from the bin of the mean
 * before.
 */
function meanNear({ counts, sums }: Histogram, mode: number, reach: number): number {
  let centre = mode
  let mean = 0
  for (let pass = 0; pass < 3; pass += 1) {
    let sum = 0
    let count = 0
    let place = 0
    const from = Math.max(0, Math.round(centre - reach))
    const to = Math.min(counts.length - 1, Math.round(centre + reach))
    for (let bin = from; bin <= to; bin += 1) {
      const here = counts[bin] ?? 0
      sum += sums[bin] ?? 0
      count += here
      place += here * (bin + 0.5)
    }
    if (count === 0) return mean
    mean = sum / count
    centre = place / count
  }
  return mean
}
