import { extremesOf } from '../waveform/extremes'
import { converterStep } from './noise-floor'

/** Fewer equal samples in a row than this at the extreme are what any rounded peak has. */
const leastRun = 4

/** A peak is cut off where the trace falls away beside its flat part so many times as fast as a rounded peak would. */
const steepness = 3

/** The last sample of the last flat, cut-off peak at either extreme from `from` to `to`; null where no peak is cut off. */
export function lastClipped(
  values: Float64Array,
  from: number,
  to: number,
  step: number = converterStep(values),
): number | null {
  const { low, high } = extremesOf(values, from, to)
  let clipped: number | null = null
  for (let index = from; index < to; index += 1) {
    const value = values[index]
    if (value !== high && value !== low) continue
    let end = index
    while (end + 1 < to && values[end + 1] === value) end += 1
    if (isCut(values, index, end, step)) clipped = end
    index = end
  }
  return clipped
}

/**
 * A rounded peak that shows one code for n samples falls by about (1 + 4/n)² steps until two samples beside them:
 * it is a parabola. A cut-off peak comes in and leaves at a slope instead.
 */
function isCut(values: Float64Array, first: number, last: number, step: number): boolean {
  const run = last - first + 1
  if (run < leastRun) return false
  const level = values[first] ?? 0
  const before = Math.abs((values[first - 2] ?? level) - level)
  const after = Math.abs((values[last + 2] ?? level) - level)
  const natural = ((1 + 4 / run) ** 2 + 1) * step
  return Math.min(before, after) > steepness * natural
}
