import { extremesOf } from '../waveform/extremes'
import type { StateLevels } from './ring-measurement'

const bins = 256

/** Samples this close to a mode, as a part of the range, belong to its level: more than one step of 8 bits. */
const nearMode = 1.5 / 100

/**
 * The low (`base`) and high (`top`) state level of a two-level waveform: the most frequent value in the lower and in
 * the upper half of the range, refined to the mean of the samples near it so that the steps of the converter average
 * out. Null where there is no range. Method: histogram modes, IEEE Std 181-2011, clause on state levels.
 */
export function stateLevels(values: Float64Array): StateLevels | null {
  const { low, high } = extremesOf(values)
  const range = high - low
  if (!(range > 0)) return null
  const counts = new Uint32Array(bins)
  for (const value of values) {
    const bin = Math.min(bins - 1, Math.floor(((value - low) / range) * bins))
    counts[bin] = (counts[bin] ?? 0) + 1
  }
  const levelAt = (bin: number) => meanNear(values, low + ((bin + 0.5) / bins) * range, nearMode * range)
  return { base: levelAt(modeOf(counts, 0, bins / 2)), top: levelAt(modeOf(counts, bins / 2, bins)) }
}

function modeOf(counts: Uint32Array, from: number, to: number): number {
  let mode = from
  for (let bin = from; bin < to; bin += 1) {
    if ((counts[bin] ?? 0) > (counts[mode] ?? 0)) mode = bin
  }
  return mode
}

function meanNear(values: Float64Array, centre: number, reach: number): number {
  let sum = 0
  let count = 0
  for (const value of values) {
    if (Math.abs(value - centre) > reach) continue
    sum += value
    count += 1
  }
  return count === 0 ? centre : sum / count
}
