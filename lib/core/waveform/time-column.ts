import { err, ok, type Result } from '../result'

import type { CaptureError } from './capture'

/** Evenly spaced instants in the unit in which they are written. */
export type TimeBase = { readonly start: number; readonly interval: number; readonly rounded: boolean }

/** A stamp may lie off its place by this part of the interval, for clocks that jitter. */
const jitter = 0.25

/**
 * The constant interval of a column of stamps: (last − first)/(samples − 1), which holds also where the stamps are
 * rounded so far that neighbours repeat. Every stamp must lie where the interval puts it, but for half the distance to
 * the neighbouring stamps (rounding) and a quarter of the interval (jitter); else the first row that does not is named.
 */
export function timeBaseOf(stamps: Float64Array, firstRow: number): Result<TimeBase, CaptureError> {
  const count = stamps.length
  const start = stamps[0] ?? 0
  const interval = ((stamps[count - 1] ?? 0) - start) / (count - 1)
  if (count < 2 || interval === 0) return err(stillTime)
  const endRounding = Math.max(gapAfter(stamps, 0), gapBefore(stamps, count - 1)) / 2
  let rounded = false
  let index = 0
  while (index < count) {
    const stamp = stamps[index] ?? 0
    let next = index + 1
    while (next < count && stamps[next] === stamp) next += 1
    const gap = Math.max(stamp - (stamps[index - 1] ?? stamp), (stamps[next] ?? stamp) - stamp)
    if (gap < 0 || (next < count && (stamps[next] ?? 0) < stamp))
      return err(unevenAt(firstRow + next, 'goes back'))
    if (next - index > 1) rounded = true
    const off = Math.max(
      Math.abs(stamp - start - index * interval),
      Math.abs(stamp - start - (next - 1) * interval),
    )
    if (off > gap / 2 + endRounding + jitter * interval) {
      return err(unevenAt(firstRow + index, 'is not evenly spaced'))
    }
    index = next
  }
  return ok({ start, interval, rounded })
}

const gapAfter = (stamps: Float64Array, index: number): number => {
  const stamp = stamps[index] ?? 0
  return Math.abs((stamps.find((other) => other !== stamp) ?? stamp) - stamp)
}

const gapBefore = (stamps: Float64Array, index: number): number => {
  const stamp = stamps[index] ?? 0
  return Math.abs((stamps.findLast((other) => other !== stamp) ?? stamp) - stamp)
}

const stillTime: CaptureError = {
  code: 'no_interval',
  message:
    'The time column does not advance, so the sample interval is not known; export the record with more digits in its time column.',
  column: 1,
}

const unevenAt = (row: number, fault: 'goes back' | 'is not evenly spaced'): CaptureError => ({
  code: 'uneven_time',
  message: `The time ${fault} at row ${row}, column 1; export one record sampled at a constant interval, without gaps.`,
  row,
  column: 1,
})
