import { extremesOf } from '../waveform/extremes'

/** What a cut-off ring is told by. */
export type SwingSearch = {
  readonly from: number
  readonly to: number
  /** The level about which it swings. */
  readonly level: number
  /** Swings within this are noise. */
  readonly floor: number
  /** One step of the converter; 0 where values have no steps. */
  readonly step: number
}

/** Fewer samples at the extreme than this are what any peak may have. */
const fewestFlat = 3

/** A peak is cut off where it has so many times the samples at its extreme that a rounded one would have. */
const excess = 1.6

/**
 * The end of the last cut-off swing, where the trace comes back to the level; null where none is cut off.
 *
 * A swing is cut off when it reaches the extreme of the record and holds its very value for longer than a rounded peak can:
 * of a half cycle of n samples and height A, about (2n/π) √(2q/A) lie within one step q of the crest.
 */
export function clippedSwingsEnd(values: Float64Array, search: SwingSearch): number | null {
  const { from, to, level } = search
  const extremes = extremesOf(values, from, to)
  let clipped: number | null = null
  let cut: number | null = null
  let start = from
  while (start < to) {
    const side = Math.sign((values[start] ?? 0) - level)
    let end = start + 1
    while (end < to && Math.sign((values[end] ?? 0) - level) === side) end += 1
    const extreme = side > 0 ? extremes.high : extremes.low
    const flat = countOf(values, start, end, extreme)
    // Beyond a cut-off swing, the next one that reaches the same value is cut off too.
    if (flat > 0 && end < to && (cut === extreme || isCut(flat, end - start, extreme, search))) {
      cut = extreme
      clipped = end
    }
    start = end
  }
  return clipped
}

function countOf(values: Float64Array, start: number, end: number, wanted: number): number {
  let count = 0
  for (let index = start; index < end; index += 1) if (values[index] === wanted) count += 1
  return count
}

function isCut(flat: number, samples: number, extreme: number, { level, floor, step }: SwingSearch): boolean {
  const height = Math.abs(extreme - level)
  if (height <= floor) return false
  const rounded = ((2 * samples) / Math.PI) * Math.sqrt((2 * step) / height)
  return flat >= fewestFlat && flat > excess * rounded + 1
}
