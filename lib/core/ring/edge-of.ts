import type { EdgeSpan } from './find-edge'
import type { Edge, StateLevels, Trace } from './ring-measurement'
import { instantOf } from './transition'

/** The levels as an edge runs through them: from its base to its top, so that base is the higher one of a falling edge. */
export const inDirection = (states: StateLevels, { direction }: EdgeSpan): StateLevels =>
  direction === 'rising' ? states : { base: states.top, top: states.base }

/** When an edge is half-way between its levels, and how long it takes from 10 to 90 % (IEEE Std 181-2011). */
export function edgeOf(trace: Trace, span: EdgeSpan, { base, top }: StateLevels): Edge {
  const progress = (index: number) => ((trace.values[index] ?? 0) - base) / (top - base)
  const at = (level: number) => instantOf(progress, span.crossing, level, span.stateEnd)
  return {
    direction: span.direction,
    instantSeconds: trace.startSeconds + at(0.5) * trace.intervalSeconds,
    transitionSeconds: (at(0.9) - at(0.1)) * trace.intervalSeconds,
  }
}
