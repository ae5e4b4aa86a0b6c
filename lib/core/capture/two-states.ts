import type { StateLevels, Trace } from '../ring/ring-measurement'
import { afterEdge, type Floors } from './after-edge'
import type { Period, PooledRing, TwoStates } from './capture-analysis'
import { findEdges } from './find-edges'
import { findPeriod, type FoundPeriod } from './find-period'
import { harmonicsOf } from './harmonics-of'
import { poolOvershoot, type FollowedEdge } from './pool-overshoot'
import { poolRings } from './pool-rings'
import { restsBetween } from './rests-between'
import { spreadChoice } from './spread-choice'
import { pooledTransition, timeEdge, type TimedEdge } from './timed-edges'

/** So many edges are timed, and so many followed by a fit of their ring; of more, a spread choice. */
const mostTimed = 8192
const mostFollowed = 24

/** A deviation from a level is no noise from so many deviations of it on, so many steps, or this part of the step. */
const deviations = 5
const steps = 1.5
const leastPart = 0.01

/** A ring that falls by less than this per radian does not decay: it is a tone on a wave of few sines. */
const leastDamping = 0.002

/** A ring still larger than this part of the step at the end has not shown the level that it settles to. */
const diedAway = 0.02

/**
 * What a record of edges between two levels shows; null where it does not rest at them, as a sum of sines does not, nor
 * swings towards them in a decaying ring.
 */
export function twoStates(
  trace: Trace,
  levels: StateLevels,
  noise: number,
  converterStep: number,
): TwoStates | null {
  const spans = findEdges(trace.values, levels)
  const stride = Math.ceil(spans.length / mostTimed)
  const chosen = spans.filter((_, index) => (index >> 1) % stride === 0)
  const edges = chosen.map((span) => timeEdge(trace.values, span, levels))
  if (edges.length === 0) return null
  const floors: Floors = {
    deviation: Math.max(deviations * noise, steps * converterStep, leastPart * (levels.top - levels.base)),
    converterStep,
  }
  const followed = spreadChoice(edges, mostFollowed).map((edge) => ({
    edge,
    after: afterEdge(trace, edge, floors),
  }))
  const pooled = poolRings(
    followed.map(({ after }) => after),
    spans.length,
    trace.intervalSeconds,
  )
  const tried = followed.map(({ edge }) => edge)
  if (!restsBetween(trace.values, tried, noise) && !decays(pooled.ring)) return null
  return describeStates(trace, edges, settle(trace, followed, spans.length), pooled, noise, stride)
}

const decays = (ring: PooledRing | null): boolean =>
  ring !== null && ring.confidence !== 'low' && ring.dampingRatio.value > leastDamping

/** The level after the only edge is that of the fitted ring where the ring has not died away. */
function settle(trace: Trace, followed: readonly FollowedEdge[], all: number): readonly FollowedEdge[] {
  const [only] = followed
  const ring = only?.after.ring ?? null
  if (all !== 1 || only === undefined || ring === null) return followed
  const { edge, after } = only
  const end = trace.startSeconds + edge.stateEnd * trace.intervalSeconds
  const left = ring.fit.amplitude * Math.exp(-ring.fit.decayRate * (end - ring.fit.startSeconds))
  if (left <= diedAway * Math.abs(edge.after - edge.before)) return followed
  const [base, top] =
    edge.direction === 'rising' ? [edge.before, ring.fit.level] : [ring.fit.level, edge.before]
  return [{ after, edge: timeEdge(trace.values, edge, { base, top }) }]
}

function describeStates(
  trace: Trace,
  timed: readonly TimedEdge[],
  followed: readonly FollowedEdge[],
  pooled: ReturnType<typeof poolRings>,
  noise: number,
  stride: number,
): TwoStates | null {
  const { intervalSeconds, startSeconds, values } = trace
  const edges = timed.length === 1 ? followed.map(({ edge }) => edge) : timed
  const [first] = edges
  if (first === undefined) return null
  const found = findPeriod({ ...middlesOf(edges), stride })
  const kind = found !== null ? 'train' : edges.length === 1 ? 'step' : 'pulses'
  const { before, after } = first
  const [base, top] = kind === 'train' ? [Math.min(before, after), Math.max(before, after)] : [before, after]
  const rising = edges.filter(({ direction }) => direction === 'rising').length
  return {
    kind,
    base,
    top,
    amplitude: Math.abs(top - base),
    direction: first.direction,
    risingEdges: rising * stride,
    fallingEdges: (edges.length - rising) * stride,
    firstEdgeSeconds: startSeconds + first.middle * intervalSeconds,
    riseTime: pooledTransition(edges, 'rising', intervalSeconds),
    fallTime: pooledTransition(edges, 'falling', intervalSeconds),
    overshoot: poolOvershoot(followed),
    ring: pooled.ring,
    ringAbsence: pooled.absence,
    period: found === null ? null : periodOf(found, intervalSeconds),
    harmonics: found === null ? null : harmonicsOf(values, found.period, intervalSeconds, noise),
  }
}

const middlesOf = (edges: readonly TimedEdge[]) => ({
  rising: edges.filter(({ direction }) => direction === 'rising').map(({ middle }) => middle),
  falling: edges.filter(({ direction }) => direction === 'falling').map(({ middle }) => middle),
})

const periodOf = ({ period, jitter, duty, periods }: FoundPeriod, intervalSeconds: number): Period => ({
  seconds: period * intervalSeconds,
  fundamental: 1 / (period * intervalSeconds),
  jitterSeconds: jitter * intervalSeconds,
  duty,
  periods,
})
