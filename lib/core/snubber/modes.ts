import { magnitude, type Complex } from '../linear/complex'
import { rootsOf } from '../linear/roots'
import { angularFrequency, normalise, type SwitchNode } from './network'

/** The poles of the node in normalised form. */
export const polesOf = (node: SwitchNode): readonly Complex[] => rootsOf(normalise(node).denominator)

/** The smallest damping ratio −Re(p)/|p| over all poles; a real pole counts as 1. */
export function leastDamping(node: SwitchNode): number {
  return Math.min(...polesOf(node).map((pole) => -pole.re / magnitude(pole)))
}

/** The damped frequency of the least-damped pair, in hertz; null when every pole is real and nothing rings. */
export function ringFrequency(node: SwitchNode): number | null {
  const ringing = polesOf(node).filter((pole) => pole.im > 1e-9)
  const frequencies = ringing.map((pole) => (pole.im * angularFrequency(node)) / (2 * Math.PI))
  return frequencies[0] ?? null
}
