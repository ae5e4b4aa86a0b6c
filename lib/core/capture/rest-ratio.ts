import { medianOf } from './median'
import type { TimedEdge } from './timed-edges'

/** Samples within so many deviations of the noise around a level are at rest there, but at least and most these parts of the step. */
const nearDeviations = 4
const leastNear = 0.075
const mostNear = 0.15

/**
 * How long a record rests at its levels, before or after the typical edge, over how long that edge takes from 10 to 90 %.
 * Above 1 between states; below 0.5 of a sine, which is near its extremes for a seventh of its period.
 */
export function restRatio(values: Float64Array, edges: readonly TimedEdge[], noise: number): number {
  const ratios = edges.map((edge) => {
    const step = Math.abs(edge.after - edge.before)
    const reach = Math.min(mostNear * step, Math.max(leastNear * step, nearDeviations * noise))
    const rest = Math.max(
      longestRest(values, edge.stateStart, edge.crossing, edge.before, reach),
      longestRest(values, edge.crossing, edge.stateEnd, edge.after, reach),
    )
    return rest / edge.transition
  })
  return medianOf(ratios)
}

function longestRest(values: Float64Array, from: number, to: number, level: number, reach: number): number {
  let longest = 0
  let start = from
  for (let index = from; index < to; index += 1) {
    const away = (values[index] ?? 0) - level
    if (away <= reach && away >= -reach) {
      if (index - start >= longest) longest = index - start + 1
    } else start = index + 1
  }
  return longest
}
