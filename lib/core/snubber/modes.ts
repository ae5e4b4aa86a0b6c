import { magnitude, type Complex } from '../linear/complex'
import { rootsOf } from '../linear/roots'
import { angularFrequency, normalise, type SwitchNode } from './network'

/** The poles of the node in normalised form. */
export const polesOf = (node: SwitchNode): readonly Complex[] => rootsOf(normalise(node).denominator)

/** The smallest damping ratio −Re(p)/|p| over all poles; a real pole counts as 1. */
export const leastDamping = (node: SwitchNode, poles = polesOf(node)): number =>
  Math.min(...poles.map((pole) => -pole.re / magnitude(pole)))

/** The damped frequency of the least-damped pair, in hertz; null when every pole is real and nothing rings. */
export function ringFrequency(node: SwitchNode, poles = polesOf(node)): number | null {
  const ringing = poles.find((pole) => pole.im > 1e-9)
  return ringing === undefined ? null : (ringing.im * angularFrequency(node)) / (2 * Math.PI)
}
