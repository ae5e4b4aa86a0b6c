import { lastClipped } from '../ring/clipped-runs'
import type { EdgeSpan } from '../ring/find-edge'
import { measureRinging } from '../ring/measure-ringing'
import type { Ring, Trace } from '../ring/ring-measurement'
import { ringAt } from '../ring/ring-figure'

/** What stands above noise and rounding; all in the unit of the record. */
export type Floors = {
  /** A deviation from a level below this is noise. */
  readonly deviation: number
  readonly converterStep: number
}

/** An edge with its own levels and how long it takes from 10 to 90 %, in samples. */
export type KnownEdge = EdgeSpan & {
  readonly before: number
  readonly after: number
  readonly transition: number
}

/** What follows one edge. */
export type AfterEdge = {
  /** The extreme beyond the level, that level itself where nothing stands above the noise. */
  readonly peak: number
  readonly isClipped: boolean
  readonly ring: Ring | null
  readonly absence: string | null
  /** Of a clipped ring: the level that its first peak had. */
  readonly reconstructedPeak: number | null
}

/** Peak and ring after an edge, up to where the next edge begins. */
export function afterEdge(trace: Trace, edge: KnownEdge, floors: Floors): AfterEdge {
  const { values } = trace
  const isLast = edge.stateEnd === values.length
  const end = isLast ? edge.stateEnd : edge.stateEnd - Math.ceil(1.5 * edge.transition)
  const to = Math.max(edge.crossing + 2, end)
  const clipped = clippedEnd(values, edge, to, floors)
  const from = clipped === null ? firstBeyond(values, edge, to) : nextCrossing(values, clipped, edge.after)
  const search = { from, to, level: edge.after, floor: floors.deviation }
  const { ring, absence } = measureRinging(trace, search)
  const peakAt = extremeIndex(values, edge, to)
  const peak = interpolatedPeak(values, peakAt)
  return {
    peak: Math.abs(peak - edge.after) > floors.deviation && isBeyond(edge, peak) ? peak : edge.after,
    isClipped: clipped !== null,
    ring,
    absence,
    reconstructedPeak: clipped === null || ring === null ? null : firstPeakOf(trace, ring, edge, peakAt),
  }
}

const isBeyond = ({ before, after }: KnownEdge, value: number): boolean =>
  (value - after) * (after - before) > 0

/** The end of the last cut-off peak; a flat level at rest is none. */
function clippedEnd(values: Float64Array, edge: KnownEdge, to: number, floors: Floors): number | null {
  const found = lastClipped(values, edge.crossing, to, floors.converterStep)
  const value = found === null ? edge.after : (values[found] ?? edge.after)
  const away = Math.min(Math.abs(value - edge.after), Math.abs(value - edge.before))
  return away > floors.deviation ? found : null
}

function firstBeyond(values: Float64Array, edge: KnownEdge, to: number): number {
  let index = edge.crossing
  while (index < to && !isBeyond(edge, values[index] ?? edge.after)) index += 1
  return index
}

/** Where the trace next passes a level after a cut-off peak. */
function nextCrossing(values: Float64Array, after: number, level: number): number {
  const side = Math.sign((values[after] ?? 0) - level)
  let index = after + 1
  while (index < values.length && Math.sign((values[index] ?? 0) - level) === side) index += 1
  return index
}

/** The middle of the samples that share the extreme beyond the level. */
function extremeIndex(values: Float64Array, { crossing, before, after }: KnownEdge, to: number): number {
  const sign = Math.sign(after - before)
  let best = crossing
  for (let index = crossing; index < to; index += 1) {
    if (sign * ((values[index] ?? 0) - (values[best] ?? 0)) > 0) best = index
  }
  let last = best
  while (last + 1 < to && values[last + 1] === values[best]) last += 1
  return Math.round((best + last) / 2)
}

/** The crest of the parabola through a highest sample and its neighbours. */
function interpolatedPeak(values: Float64Array, index: number): number {
  const middle = values[index] ?? 0
  const left = (values[index - 1] ?? middle) - middle
  const right = (values[index + 1] ?? middle) - middle
  const bend = left + right
  return bend === 0 || left * right < 0 ? middle : middle - (right - left) ** 2 / (8 * bend)
}

const steps = 64

/** The crest that the fitted ring, carried back to before its start, has within half a cycle of the cut-off peak. */
function firstPeakOf(trace: Trace, ring: Ring, edge: KnownEdge, peakAt: number): number {
  const middle = trace.startSeconds + peakAt * trace.intervalSeconds
  const sign = Math.sign(edge.after - edge.before)
  const quarter = 0.25 / ring.dampedFrequency
  let best = -Infinity
  for (let step = -steps; step <= steps; step += 1) {
    const instant = middle + (step / steps) * quarter
    best = Math.max(best, sign * ringAt(ring.fit, ring.dampedFrequency, instant))
  }
  return sign * best
}
