import { err, ok, type Result } from '../result'

import { lastClipped } from './clipped-runs'
import { edgeOf, inDirection } from './edge-of'
import { findEdge, type EdgeSpan } from './find-edge'
import { measureRinging } from './measure-ringing'
import { noiseFloor } from './noise-floor'
import type { Ring, RingError, RingMeasurement, StateLevels, Trace } from './ring-measurement'
import { stateLevels } from './state-levels'

export type RingInput = Trace & {
  /** The window to look at, in seconds; absent means the whole record. */
  readonly from?: number
  readonly to?: number
}

const fewestSamples = 32

/** A ring that is still larger than this part of the step at the end has not shown the level it settles to. */
const diedAway = 0.02

/**
 * Measures the first edge in a window and the ringing after it: state levels from the histogram (IEEE Std 181-2011),
 * transition time from 10 to 90 %, overshoot (peak − top)/(top − base), and the ring by `measureRinging`.
 * Values in any one unit, times in seconds. Errors: fewer than 32 samples; no edge between two levels.
 */
export function measureRing(input: RingInput): Result<RingMeasurement, RingError> {
  const trace = windowOf(input)
  if (trace.values.length < fewestSamples) return err(tooFewSamples)
  const states = stateLevels(trace.values)
  const span = states === null ? null : findEdge(trace.values, states)
  if (states === null || span === null) return err(noEdge)
  const settled = inDirection(states, span)
  const floor = noiseFloor(trace.values, span, settled.top - settled.base)
  // Two modes within the noise are one level.
  if (Math.abs(settled.top - settled.base) < 2 * floor) return err(noEdge)
  return ok(measure(trace, span, settled, floor))
}

function measure(trace: Trace, span: EdgeSpan, settled: StateLevels, floor: number): RingMeasurement {
  const clipped = lastClipped(trace.values, span.crossing, span.stateEnd)
  const from =
    clipped === null
      ? firstBeyond(trace.values, span, settled.top)
      : firstCrossing(trace.values, clipped, settled.top)
  const { ring, absence } = measureRinging(trace, { from, to: span.stateEnd, level: settled.top, floor })
  const stillRinging =
    ring !== null && amplitudeAtEnd(ring, trace, span) > diedAway * Math.abs(settled.top - settled.base)
  const levels = { base: settled.base, top: stillRinging ? ring.fit.level : settled.top }
  const peak = peakOf(trace.values, span, levels, floor)
  return {
    windowSeconds: [
      trace.startSeconds,
      trace.startSeconds + (trace.values.length - 1) * trace.intervalSeconds,
    ],
    edge: edgeOf(trace, span, levels),
    levels: { ...levels, peak },
    overshootFraction: (peak - levels.top) / (levels.top - levels.base),
    overshootIsLowerBound: clipped !== null,
    ring,
    ringAbsence: absence,
    warnings: [...(clipped === null ? [] : [clippedWarning]), ...(stillRinging ? [stillRingingWarning] : [])],
  }
}

function windowOf({ values, startSeconds, intervalSeconds, from, to }: RingInput): Trace {
  const first =
    from === undefined ? 0 : Math.max(0, Math.ceil((from - startSeconds) / intervalSeconds - 1e-6))
  const end = to === undefined ? values.length : Math.floor((to - startSeconds) / intervalSeconds + 1e-6) + 1
  return {
    values: values.subarray(first, Math.max(first, end)),
    startSeconds: startSeconds + first * intervalSeconds,
    intervalSeconds,
  }
}

/** The first sample beyond the top: the ring begins there, free of the edge itself. */
function firstBeyond(values: Float64Array, span: EdgeSpan, top: number): number {
  const sign = span.direction === 'rising' ? 1 : -1
  let index = span.crossing
  while (index < span.stateEnd && sign * ((values[index] ?? 0) - top) <= 0) index += 1
  return index
}

/** Where the trace next passes a level after a cut-off peak. */
function firstCrossing(values: Float64Array, after: number, level: number): number {
  const side = Math.sign((values[after] ?? 0) - level)
  let index = after + 1
  while (index < values.length && Math.sign((values[index] ?? 0) - level) === side) index += 1
  return index
}

function peakOf(values: Float64Array, span: EdgeSpan, { base, top }: StateLevels, floor: number): number {
  const sign = Math.sign(top - base)
  let peak = top
  for (let index = span.crossing; index < span.stateEnd; index += 1) {
    const value = values[index] ?? 0
    if (sign * (value - peak) > 0) peak = value
  }
  return Math.abs(peak - top) > floor ? peak : top
}

function amplitudeAtEnd(ring: Ring, trace: Trace, span: EdgeSpan): number {
  const end = trace.startSeconds + span.stateEnd * trace.intervalSeconds
  return ring.fit.amplitude * Math.exp(-ring.fit.decayRate * (end - ring.fit.startSeconds))
}

const tooFewSamples: RingError = {
  code: 'too_few_samples',
  message: `The window holds fewer than ${fewestSamples} samples; widen it.`,
}

const noEdge: RingError = {
  code: 'no_edge',
  message:
    'There is no edge between two settled levels in the window; choose a window that begins before an edge and ends before the next one.',
}

const clippedWarning =
  'The trace is cut off by the vertical range of the instrument: the overshoot is at least the stated value, and the ring is measured after the cut-off part.'

const stillRingingWarning =
  'The ring has not died away within the window; the top level is taken from the fitted ring.'
