import { minimiseOn } from '../linear/minimise'
import { magnitude, type Complex } from '../linear/complex'
import { valueOf, type EdgeResponse } from './edge-response'

const samples = 600

/** The largest value of a response and when it is reached, in normalised time. */
export function peakOf(response: EdgeResponse, poles: readonly Complex[]): { time: number; value: number } {
  const slowest = Math.min(...poles.map((pole) => magnitude(pole)))
  // The first maximum after the edge is the highest: every mode decays from there.
  const horizon = response.edge + (2.2 * Math.PI) / slowest
  return maximumOn(response, horizon, 1)
}

/** The largest magnitude, for a current that swings both ways. */
export function peakMagnitudeOf(response: EdgeResponse, poles: readonly Complex[]): number {
  const slowest = Math.min(...poles.map((pole) => magnitude(pole)))
  const horizon = response.edge + (2.2 * Math.PI) / slowest
  return Math.max(maximumOn(response, horizon, 1).value, maximumOn(response, horizon, -1).value)
}

function maximumOn(response: EdgeResponse, horizon: number, sign: 1 | -1): { time: number; value: number } {
  const at = (time: number) => sign * valueOf(response, time)
  const step = horizon / samples
  let best = 0
  for (let index = 0; index <= samples; index += 1) {
    if (at(index * step) > at(best * step)) best = index
  }
  const low = Math.max(0, (best - 1) * step)
  const time = minimiseOn((t) => -at(t), low, (best + 1) * step, 1e-10)
  return at(time) > at(best * step)
    ? { time, value: at(time) }
    : { time: best * step, value: at(best * step) }
}

/** The time from the first crossing of 10 % to the first crossing of 90 % of the final value, normalised. */
export function riseTimeOf(response: EdgeResponse, poles: readonly Complex[]): number {
  return firstCrossing(response, poles, 0.9) - firstCrossing(response, poles, 0.1)
}

function firstCrossing(response: EdgeResponse, poles: readonly Complex[], level: number): number {
  const fastest = Math.max(...poles.map((pole) => magnitude(pole)))
  const slowest = Math.min(...poles.map((pole) => magnitude(pole)))
  const step = Math.max(response.edge, 1 / slowest) / Math.max(200, (40 * fastest) / slowest)
  const limit = response.edge + 60 / slowest
  let time = 0
  while (valueOf(response, time) < level && time < limit) time += step
  let low = Math.max(0, time - step)
  let high = time
  for (let halving = 0; halving < 60; halving += 1) {
    const middle = (low + high) / 2
    if (valueOf(response, middle) < level) low = middle
    else high = middle
  }
  return (low + high) / 2
}
