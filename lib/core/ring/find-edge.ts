import type { StateLevels } from './ring-measurement'

/** An edge among samples: the state before it, the edge, and the state after it up to the next edge or the end. */
export type EdgeSpan = {
  readonly direction: 'rising' | 'falling'
  readonly stateStart: number
  /** The first sample beyond half of the way. */
  readonly crossing: number
  readonly stateEnd: number
}

/** Samples within this part of the step around a level are at rest there. */
const atRest = 0.1

/** A stretch of which this part is at rest is a state; of a ring wide enough to cross the middle, only 13 % is. */
const restPart = 0.3

/** Fewer samples at rest than this are chance. */
const restSamples = 8

/** Crossings count when the trace goes through the band from 40 to 60 %, so that noise makes none. */
const hysteresis = 0.1

type Stretch = { readonly start: number; readonly end: number; readonly high: boolean }

/**
 * The first edge that leaves a state at rest, and the stretch after it until the next such edge: where a ring swings
 * back through the middle, that is no edge, because it is nowhere at rest. Null where there is none.
 */
export function findEdge(values: Float64Array, levels: StateLevels): EdgeSpan | null {
  const stretches = stretchesOf(values, levels)
  let left: Stretch | null = null
  for (const stretch of stretches) {
    if (!isState(values, levels, stretch)) continue
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

function stretchesOf(values: Float64Array, { base, top }: StateLevels): readonly Stretch[] {
  const middle = (base + top) / 2
  const band = hysteresis * (top - base)
  const stretches: Stretch[] = []
  let high = (values[0] ?? 0) > middle
  let start = 0
  let lastOnSide = 0
  for (let index = 1; index < values.length; index += 1) {
    const value = values[index] ?? 0
    if (value > middle === high) lastOnSide = index
    if (high ? value > middle - band : value < middle + band) continue
    stretches.push({ start, end: lastOnSide + 1, high })
    start = lastOnSide + 1
    lastOnSide = index
    high = !high
  }
  stretches.push({ start, end: values.length, high })
  return stretches
}

function isState(values: Float64Array, { base, top }: StateLevels, { start, end, high }: Stretch): boolean {
  const level = high ? top : base
  const reach = atRest * (top - base)
  let count = 0
  for (let index = start; index < end; index += 1) {
    if (Math.abs((values[index] ?? 0) - level) <= reach) count += 1
  }
  return count >= Math.max(restSamples, restPart * (end - start))
}
