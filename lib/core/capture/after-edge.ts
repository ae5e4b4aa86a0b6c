import type { EdgeSpan } from '../ring/find-edge'
import { measureRinging } from '../ring/measure-ringing'
import type { Ring, Trace } from '../ring/ring-measurement'
import { ringAt } from '../ring/ring-figure'
import { clippedSwingsEnd } from './clipped-swings'
import { ringOverTail, type RingWithTail } from './ring-over-tail'

/** What stands above noise and rounding; all in the unit of the record. */
export type Floors = {
  /** A deviation from a level below this is noise. */
  readonly deviation: number
  readonly converterStep: number
  /** Standard deviation from sample to sample. */
  readonly noise: number
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
  /** The exponential that the ring of a damped node rides on; null where there is none. */
  readonly tail: RingWithTail['tail'] | null
  readonly absence: string | null
  /** Of a clipped ring: the level that its first peak had. */
  readonly reconstructedPeak: number | null
}

/** With fewer samples a cycle than this, the fitted ring tells its crest better than the samples near it. */
const coarse = 20

/** Peak and ring after an edge, up to where the next edge begins. */
export function afterEdge(trace: Trace, edge: KnownEdge, floors: Floors): AfterEdge {
  const { values } = trace
  const isLast = edge.stateEnd === values.length
  const end = isLast ? edge.stateEnd : edge.stateEnd - Math.ceil(1.5 * edge.transition)
  const to = Math.max(edge.crossing + 2, end)
  const beyond = firstBeyond(values, edge, to)
  const clipped = clippedSwingsEnd(values, {
    from: beyond,
    to,
    level: edge.after,
    floor: floors.deviation,
    step: floors.converterStep,
  })
  const from = clipped ?? beyond
  const search = { from, to, level: edge.after, floor: floors.deviation }
  const { ring, absence } = measureRinging(trace, search)
  const peakAt = extremeIndex(values, edge, to)
  const measured = interpolatedPeak(values, peakAt)
  const crest = ring === null || clipped !== null ? null : coarseCrest(trace, ring, edge)
  const peak = crest ?? measured
  const damped = ring === null ? null : ringOverTail(trace, ring, to, floors.noise)
  const isHidden = crest !== null && ring !== null && isFlattened(trace, ring, edge, peakAt, crest, floors)
  return {
    peak: Math.abs(peak - edge.after) > floors.deviation && isBeyond(edge, peak) ? peak : edge.after,
    isClipped: clipped !== null || isHidden,
    ring: damped?.ring ?? ring,
    tail: damped?.tail ?? null,
    absence,
    reconstructedPeak: clipped === null || ring === null ? crest : firstPeakOf(trace, ring, edge, peakAt),
  }
}

/** The first crest of a ring with few samples a cycle: the highest sample may be that of a later, lower crest. */
function coarseCrest(trace: Trace, ring: Ring, edge: KnownEdge): number | null {
  if (coarse * trace.intervalSeconds * ring.dampedFrequency <= 1) return null
  // A fit begins at the first swing.
  return firstPeakOf(trace, ring, edge, indexOf(trace, ring.fit.startSeconds))
}

/** Whether two samples share an extreme further below the crest of the fit than a crest between samples can hide. */
function isFlattened(
  { values, intervalSeconds }: Trace,
  ring: Ring,
  edge: KnownEdge,
  peakAt: number,
  crest: number,
  floors: Floors,
): boolean {
  const extreme = values[peakAt] ?? crest
  const hidden = 1 - Math.cos(Math.PI * ring.dampedFrequency * intervalSeconds)
  const isShared = values[peakAt - 1] === extreme || values[peakAt + 1] === extreme
  return isShared && Math.abs(crest - extreme) > hidden * Math.abs(crest - edge.after) + floors.deviation
}

const indexOf = ({ startSeconds, intervalSeconds }: Trace, instant: number): number =>
  Math.round((instant - startSeconds) / intervalSeconds)

const isBeyond = ({ before, after }: KnownEdge, value: number): boolean =>
  (value - after) * (after - before) > 0

function firstBeyond(values: Float64Array, edge: KnownEdge, to: number): number {
  let index = edge.crossing
  while (index < to && !isBeyond(edge, values[index] ?? edge.after)) index += 1
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
