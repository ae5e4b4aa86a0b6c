import type { StateLevels } from './ring-measurement'
import { restsAtLevel, stretchesOf, type Stretch } from './state-stretches'

/** An edge among samples: the state before it, the edge, and the state after it up to the next edge or the end. */
export type EdgeSpan = {
  readonly direction: 'rising' | 'falling'
  readonly stateStart: number
  /** The first sample beyond half of the way. */
  readonly crossing: number
  readonly stateEnd: number
}

/**
 * The first edge that leaves a state at rest, and the stretch after it until the next such edge: where a ring swings
 * back through the middle, that is no edge, because it is nowhere at rest. Null where there is none.
 */
export function findEdge(values: Float64Array, levels: StateLevels): EdgeSpan | null {
  const stretches = stretchesOf(values, levels)
  let left: Stretch | null = null
  for (const stretch of stretches) {
    if (!restsAtLevel(values, levels, stretch)) continue
    if (left !== null && left.high !== stretch.high) return spanOf(left, stretch)
    left = stretch
  }
  // The record may end before the ring has come to rest.
  const last = stretches.at(-1)
  return left === null || last === undefined || left === last ? null : spanOf(left, last)
}

const spanOf = (left: Stretch, right: Stretch): EdgeSpan => ({
  direction: left.high ? 'falling' : 'rising',
  stateStart: left.start,
  crossing: left.end,
  stateEnd: right.end,
})
