import type { Ring, StateLevels, Trace } from '../ring/ring-measurement'
import { afterEdge, type Floors } from './after-edge'
import type { Harmonics, Period, PooledRing, TwoStates } from './capture-analysis'
import { findEdges } from './find-edges'
import { findPeriod, type FoundPeriod } from './find-period'
import { harmonicsOf } from './harmonics-of'
import { medianOf } from './median'
import { poolOvershoot, type FollowedEdge } from './pool-overshoot'
import { poolRings } from './pool-rings'
import { restRatio } from './rest-ratio'
import { spreadChoice } from './spread-choice'
import { isSumOfSines } from './tones-of'
import { pooledTransition, timeEdge, type TimedEdge } from './timed-edges'
import type { ValueSummary } from './value-range'

/** So many edges are timed, and so many followed by a fit of their ring; of more, a spread choice. */
const mostTimed = 2048
const mostFollowed = 16

/** A deviation from a level is no noise from so many deviations of it on, so many steps, or this part of the step. */
const deviations = 5
const steps = 1.5
const leastPart = 0.01

/** A record that rests at its levels for as long as its edges take has states; for so many times as long, beyond doubt. */
const leastRest = 1
const surelyRests = 40

/** The harmonics of a train make up this part of its power about the mean. */
const mostOfPower = 0.8

/** A ring that falls by less than this per radian does not decay: it is a tone on a wave of few sines. */
const leastDamping = 0.002

/** A ring still larger than this part of the step at the end has not shown the level that it settles to. */
const diedAway = 0.005

/**
 * What a record of edges between two levels shows; null where it does not rest at them, as a sum of sines does not, nor
 * swings towards them in a decaying ring.
 */
export function twoStates(
  trace: Trace,
  levels: StateLevels,
  noise: number,
  { converterStep, deviation }: ValueSummary,
): TwoStates | null {
  const spans = findEdges(trace.values, levels)
  const stride = Math.ceil(spans.length / mostTimed)
  const chosen = spans.filter((_, index) => (index >> 1) % stride === 0)
  const edges = chosen.map((span) => timeEdge(trace.values, span, levels, noise))
  if (edges.length === 0) return null
  const floors: Floors = {
    deviation: Math.max(deviations * noise, steps * converterStep, leastPart * (levels.top - levels.base)),
    converterStep,
    noise,
  }
  const followed = spreadChoice(edges, mostFollowed).map((edge) => ({
    edge,
    after: afterEdge(trace, edge, floors),
  }))
  const pooled = poolRings(
    followed.map(({ after }) => after),
    spans.length,
    trace.intervalSeconds,
    noise,
  )
  const tried = followed.map(({ edge }) => edge)
  const ratio = restRatio(trace.values, tried, noise)
  if (!(ratio >= leastRest || decays(pooled.ring))) return null
  const settled = settledLevels(trace, followed, levels)
  const retimed = (edge: TimedEdge) =>
    settled.base === levels.base && settled.top === levels.top
      ? edge
      : timeEdge(trace.values, edge, settled, noise)
  const states = describeStates(
    trace,
    edges.map(retimed),
    followed.map(({ edge, after }) => ({ edge: retimed(edge), after })),
    pooled,
    noise,
    stride,
  )
  const isDoubtful =
    ratio < surelyRests &&
    (states?.harmonics ? powerOf(states.harmonics) < mostOfPower * deviation ** 2 : true)
  return isDoubtful && isSumOfSines(trace.values, trace.intervalSeconds) ? null : states
}

/** Mean square of the sines of a train. */
const powerOf = ({ list }: Harmonics): number =>
  list.reduce((sum, { amplitude }) => sum + amplitude ** 2 / 2, 0)

const decays = (ring: PooledRing | null): boolean =>
  ring !== null && ring.confidence !== 'low' && ring.dampingRatio.value > leastDamping

/** The levels to which rings settle that have not died away where their states end; else those of the histogram. */
function settledLevels(trace: Trace, followed: readonly FollowedEdge[], levels: StateLevels): StateLevels {
  const levelAfter = (direction: TimedEdge['direction']) => {
    const fits = followed.flatMap(({ edge, after: { ring } }) =>
      edge.direction === direction && ring !== null && isLeft(trace, edge, ring) ? [ring.fit.level] : [],
    )
    return fits.length === 0 ? null : medianOf(fits)
  }
  return { base: levelAfter('falling') ?? levels.base, top: levelAfter('rising') ?? levels.top }
}

function isLeft({ startSeconds, intervalSeconds }: Trace, edge: TimedEdge, { fit }: Ring): boolean {
  const end = startSeconds + edge.stateEnd * intervalSeconds
  const left = fit.amplitude * Math.exp(-fit.decayRate * (end - fit.startSeconds))
  return left > diedAway * Math.abs(edge.after - edge.before)
}

function describeStates(
  trace: Trace,
  edges: readonly TimedEdge[],
  followed: readonly FollowedEdge[],
  pooled: ReturnType<typeof poolRings>,
  noise: number,
  stride: number,
): TwoStates | null {
  const { intervalSeconds, startSeconds, values } = trace
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
