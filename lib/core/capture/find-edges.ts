import type { EdgeSpan } from '../ring/find-edge'
import type { StateLevels } from '../ring/ring-measurement'
import { stretchesOf, type Stretch } from '../ring/state-stretches'

/** Samples within this part of the step around a level are at rest there. */
const atRest = 0.1

/**
 * A stretch of which this part is at rest is a state. Of the trough of a ring that swings back through the middle, and as
 * far as the level before the edge, no more than arccos(0.9)/arccos(0.5) = 0.43 is.
 */
const restPart = 0.45

/** Fewer samples at rest than this are chance. */
const restSamples = 3

/** A stretch that goes through its level so often, by more than a twentieth of the step, holds a ring about it. */
const ringCrossings = 5
const ringBand = 0.05

/**
 * All edges between states: where a ring swings back through the middle, that is no edge, because it neither rests nor
 * swings about a level there. The last edge may have no state after it, where the record ends before it has come to rest;
 * such an edge is given only when it is the only one.
 */
export function findEdges(values: Float64Array, levels: StateLevels): readonly EdgeSpan[] {
  const stretches = stretchesOf(values, levels)
  const states: Stretch[] = []
  for (const stretch of stretches) {
    if (!isState(values, levels, stretch)) continue
    const before = states.at(-1)
    // The same state, seen again after a ring that swung through the middle.
    if (before?.high === stretch.high) states[states.length - 1] = { ...before, end: stretch.end }
    else states.push(stretch)
  }
  const edges = states.slice(1).map((state, index) => spanOf(states[index] ?? state, state.end))
  const last = stretches.at(-1)
  const [only] = states
  if (edges.length > 0 || only === undefined || last === undefined || only.end >= last.end) return edges
  return [spanOf(only, last.end)]
}

const spanOf = (left: Stretch, stateEnd: number): EdgeSpan => ({
  direction: left.high ? 'falling' : 'rising',
  stateStart: left.start,
  crossing: left.end,
  stateEnd,
})

function isState(values: Float64Array, { base, top }: StateLevels, { start, end, high }: Stretch): boolean {
  const level = high ? top : base
  const reach = atRest * (top - base)
  const band = ringBand * (top - base)
  let resting = 0
  let crossings = 0
  let side = 0
  for (let index = start; index < end; index += 1) {
    const away = (values[index] ?? 0) - level
    if (away <= reach && away >= -reach) resting += 1
    const now = away > band ? 1 : away < -band ? -1 : side
    if (now !== side && side !== 0) crossings += 1
    side = now
  }
  const rests = resting >= restSamples && resting >= restPart * (end - start)
  return rests || crossings >= ringCrossings
}
