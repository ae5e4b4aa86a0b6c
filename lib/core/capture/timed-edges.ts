import type { EdgeSpan } from '../ring/find-edge'
import type { StateLevels } from '../ring/ring-measurement'
import type { Pooled } from './capture-analysis'
import { edgeInstants } from './level-crossing'
import { deviationOf, medianOf } from './median'

/** An edge with its own levels and instants, in samples. */
export type TimedEdge = EdgeSpan & {
  /** Levels of the states before and after it. */
  readonly before: number
  readonly after: number
  /** When it passes half of the way. */
  readonly middle: number
  /** From 10 to 90 % of the way. */
  readonly transition: number
}

/** Levels, instants and transition of an edge. */
export function timeEdge(
  values: Float64Array,
  span: EdgeSpan,
  { base, top }: StateLevels,
  noise: number,
): TimedEdge {
  const [before, after] = span.direction === 'rising' ? [base, top] : [top, base]
  const { stateStart: start, stateEnd: end, crossing } = span
  const { at10, at50, at90 } = edgeInstants({ values, before, after, crossing, start, end, noise })
  return { ...span, before, after, middle: at50, transition: at90 - at10 }
}

/** Median and spread of the transitions in one direction, in seconds; null where there is none. */
export function pooledTransition(
  edges: readonly TimedEdge[],
  direction: EdgeSpan['direction'],
  intervalSeconds: number,
): Pooled | null {
  const times = edges
    .filter((edge) => edge.direction === direction)
    .map(({ transition }) => transition * intervalSeconds)
  return times.length === 0
    ? null
    : { median: medianOf(times), spread: deviationOf(times), edges: times.length }
}
