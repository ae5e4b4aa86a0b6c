import { extremesOf } from './extremes'

/** A record thinned for drawing: in each column of the plot the instant and the extremes of its samples. */
export type DecimatedTrace = {
  readonly x: readonly number[]
  readonly min: readonly number[]
  readonly max: readonly number[]
}

/**
 * The samples from `from` to `to` (seconds, with one more at each side so that a line reaches the edge of the plot) in
 * at most `buckets` columns that hold equally many. Each keeps its true smallest and largest sample, so that no spike
 * is lost; x is the middle instant of a column. Where there are no more samples than columns, they are the samples.
 */
export function decimateMinMax(
  values: Float64Array,
  startSeconds: number,
  intervalSeconds: number,
  from: number,
  to: number,
  buckets: number,
): DecimatedTrace {
  const first = Math.max(0, Math.floor((from - startSeconds) / intervalSeconds) - 1)
  const last = Math.min(values.length - 1, Math.ceil((to - startSeconds) / intervalSeconds) + 1)
  const count = last - first + 1
  if (!(count > 0)) return { x: [], min: [], max: [] }
  const columns = Math.min(Math.max(1, Math.floor(buckets)), count)
  const x: number[] = []
  const min: number[] = []
  const max: number[] = []
  for (let column = 0; column < columns; column += 1) {
    const begin = first + Math.ceil((column * count) / columns)
    const end = first + Math.ceil(((column + 1) * count) / columns)
    const { low, high } = extremesOf(values, begin, end)
    x.push(startSeconds + ((begin + end - 1) / 2) * intervalSeconds)
    min.push(low)
    max.push(high)
  }
  return { x, min, max }
}
