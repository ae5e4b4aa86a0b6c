import { extremesOf } from './extremes'

/** Samples to one entry of an overview: 10 million samples become 39,000 entries. */
export const samplesPerEntry = 256

/**
 * The lowest and the highest of every 256 samples, one pair after another: what a long record is drawn from when it is
 * seen whole. The last entry may stand for fewer samples.
 */
export function overviewOf(values: Float64Array): Float64Array {
  const entries = Math.ceil(values.length / samplesPerEntry)
  const overview = new Float64Array(2 * entries)
  for (let entry = 0; entry < entries; entry += 1) {
    const begin = entry * samplesPerEntry
    const { low, high } = extremesOf(values, begin, Math.min(values.length, begin + samplesPerEntry))
    overview[2 * entry] = low
    overview[2 * entry + 1] = high
  }
  return overview
}

/** The entries of an overview in at most `columns` columns of whole entries; x counts samples from the first entry. */
export function columnsOfOverview(overview: Float64Array, columns: number) {
  const entries = overview.length / 2
  const count = Math.min(columns, entries)
  const x: number[] = []
  const min: number[] = []
  const max: number[] = []
  for (let column = 0; column < count; column += 1) {
    const begin = Math.ceil((column * entries) / count)
    const end = Math.ceil(((column + 1) * entries) / count)
    let low = Infinity
    let high = -Infinity
    for (let entry = begin; entry < end; entry += 1) {
      low = Math.min(low, overview[2 * entry] ?? Infinity)
      high = Math.max(high, overview[2 * entry + 1] ?? -Infinity)
    }
    x.push(((begin + end) * samplesPerEntry - 1) / 2)
    min.push(low)
    max.push(high)
  }
  return { x, min, max }
}
