import { medianOf } from './median'
import type { TimedEdge } from './timed-edges'

/** Samples within this part of the step around a level are at rest there, and within so many deviations of the noise. */
const nearLevel = 0.075
const nearDeviations = 4

/**
 * Whether a record rests at its levels, before or after the typical edge, for at least as long as the edge takes from 10 to
 * 90 %. Edges between states do; a sine, at rest for a seventh of its period at most, does not.
 */
export function restsBetween(values: Float64Array, edges: readonly TimedEdge[], noise: number): boolean {
  const ratios = edges.map((edge) => {
    const reach = Math.max(nearLevel * Math.abs(edge.after - edge.before), nearDeviations * noise)
    const rest = Math.max(
      longestRest(values, edge.stateStart, edge.crossing, edge.before, reach),
      longestRest(values, edge.crossing, edge.stateEnd, edge.after, reach),
    )
    return rest / edge.transition
  })
  return ratios.length > 0 && medianOf(ratios) >= 1
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
