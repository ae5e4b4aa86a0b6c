import type { AfterEdge } from './after-edge'
import type { Overshoot } from './capture-analysis'
import { deviationOf, medianOf } from './median'
import type { TimedEdge } from './timed-edges'

/** An edge and what follows it. */
export type FollowedEdge = { readonly edge: TimedEdge; readonly after: AfterEdge }

/**
 * Overshoot (peak − top)/(top − base) as the median over edges; where half of them or more are cut off, it is a lower
 * bound, and the peaks of the fitted rings are given beside it.
 */
export function poolOvershoot(followed: readonly FollowedEdge[]): Overshoot {
  const fractionOf = ({ edge }: FollowedEdge, peak: number) =>
    (peak - edge.after) / (edge.after - edge.before)
  const fractions = followed.map((item) => fractionOf(item, item.after.peak))
  const clipped = followed.filter(({ after }) => after.isClipped)
  const rebuilt = clipped.flatMap((item) => {
    const { reconstructedPeak: peak } = item.after
    return peak === null ? [] : [fractionOf(item, peak)]
  })
  const fraction = medianOf(fractions)
  const isLowerBound = 2 * clipped.length >= followed.length
  const { edge } = followed[0] ?? {}
  return {
    fraction,
    spread: deviationOf(fractions),
    isLowerBound,
    reconstructed: isLowerBound && rebuilt.length > 0 ? Math.max(fraction, medianOf(rebuilt)) : null,
    peakLevel: edge === undefined ? NaN : edge.after + fraction * (edge.after - edge.before),
  }
}
