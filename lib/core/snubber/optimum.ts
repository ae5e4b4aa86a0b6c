import { minimiseOn } from '../linear/minimise'
import { rootsOf } from '../linear/roots'
import { edgeResponse } from './edge-response'
import { peakOf } from './edge-measures'
import { leastDamping } from './modes'
import { angularFrequency, characteristicImpedance, normalise, type SwitchNode } from './network'

type BareNode = Omit<SwitchNode, 'snubber'>

/** Both optima lie within this factor of the closed form for no series resistance. */
const searchFactor = 10

/** Points of the first, coarse search. */
const coarse = 80

export const withSnubber = (node: BareNode, resistance: number, capacitance: number): SwitchNode => ({
  inductance: node.inductance,
  capacitance: node.capacitance,
  seriesResistance: node.seriesResistance,
  snubber: { resistance, capacitance },
})

/** The overshoot as a fraction of the step, for a straight edge of the given duration in seconds. */
export function overshootOf(node: SwitchNode, edgeDuration: number): number {
  const { nodeVoltage, denominator } = normalise(node)
  const poles = rootsOf(denominator)
  const response = edgeResponse(nodeVoltage, denominator, edgeDuration * angularFrequency(node), poles)
  return Math.max(0, peakOf(response, poles) - 1)
}

/**
 * The Rs with the least overshoot for a given Cs, by search over the exact response to the given edge; no closed form
 * is known.
 */
export function leastOvershootResistance(node: BareNode, capacitance: number, edgeDuration = 0): number {
  const z0 = characteristicImpedance(node)
  const overshootAt = (logRho: number) =>
    overshootOf(withSnubber(node, Math.exp(logRho) * z0, capacitance), edgeDuration)
  return Math.exp(bestOf(overshootAt, capacitance / node.capacitance)) * z0
}

/** Rs/Z0 of most damping without series resistance; above k = 8 as for 8, near which the optimum stays. */
const closedFormRho = (k: number): number => (1 + Math.min(k, 8)) ** 0.75 / Math.min(k, 8)

/**
 * The Rs with the largest least damping ratio for a given Cs. Without series resistance it is in closed form
 *
 *     Rs = Z0 (1 + k)^(3/4)/k,   ζ = (√(1 + k) − 1)/2,   k = Cs/Cpar ≤ 8
 *
 * For k > 8 a whole interval of Rs gives three real poles; its geometric middle is found by search, as is the optimum
 * with series resistance. Derived for this network; checked against a numeric search of the poles.
 */
export function mostDampingResistance(node: BareNode, capacitance: number): number {
  const z0 = characteristicImpedance(node)
  const k = capacitance / node.capacitance
  if (node.seriesResistance === 0 && k <= 8) return z0 * closedFormRho(k)
  const dampingAt = (logRho: number) => leastDamping(withSnubber(node, Math.exp(logRho) * z0, capacitance))
  const best = bestOf((logRho) => -dampingAt(logRho), k)
  if (dampingAt(best) < 1 - 1e-9) return Math.exp(best) * z0
  return Math.exp(middleOfRealInterval((logRho) => dampingAt(logRho) >= 1 - 1e-9, best)) * z0
}

/** Coarse scan, then golden section around the best point. */
function bestOf(objective: (logRho: number) => number, k: number): number {
  const low = Math.log(closedFormRho(k) / searchFactor)
  const step = (2 * Math.log(searchFactor)) / coarse
  let best = low
  let least = objective(low)
  for (let index = 1; index <= coarse; index += 1) {
    const candidate = low + index * step
    const value = objective(candidate)
    if (value < least) [best, least] = [candidate, value]
  }
  return minimiseOn(objective, best - step, best + step, 1e-9)
}

/** The least and the most Rs with which every pole is real, in ohms; null where one rings with any Rs. */
export function allRealInterval(
  node: BareNode,
  capacitance: number,
): { readonly low: number; readonly high: number } | null {
  const z0 = characteristicImpedance(node)
  const k = capacitance / node.capacitance
  const dampingAt = (logRho: number) => leastDamping(withSnubber(node, Math.exp(logRho) * z0, capacitance))
  const best = bestOf((logRho) => -dampingAt(logRho), k)
  if (dampingAt(best) < 1 - 1e-9) return null
  const [low, high] = realInterval((logRho) => dampingAt(logRho) >= 1 - 1e-9, best)
  return { low: Math.exp(low) * z0, high: Math.exp(high) * z0 }
}

const middleOfRealInterval = (isReal: (logRho: number) => boolean, inside: number): number => {
  const [low, high] = realInterval(isReal, inside)
  return (low + high) / 2
}

function realInterval(isReal: (logRho: number) => boolean, inside: number): readonly [number, number] {
  const edgeTowards = (direction: 1 | -1) => {
    let near = inside
    let far = inside + direction
    for (let halving = 0; halving < 50; halving += 1) {
      const middle = (near + far) / 2
      if (isReal(middle)) near = middle
      else far = middle
    }
    return near
  }
  return [edgeTowards(-1), edgeTowards(1)]
}
