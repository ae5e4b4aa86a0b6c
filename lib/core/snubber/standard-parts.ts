import { neighboursOf, nearestByRatio } from '../parts/preferred-values'
import { leastOvershootResistance, overshootOf, withSnubber } from './optimum'
import type { SwitchNode } from './network'

type BareNode = Omit<SwitchNode, 'snubber'>

export type StandardSnubber = {
  readonly capacitance: number
  readonly resistance: number
  readonly overshoot: number
}

/** Multiples of Cpar that are worth comparing: below 1 little is gained, above 6 the loss grows faster than the gain. */
const worthwhileRatios = [1, 1.5, 2, 3, 4, 6]

/** The E24 resistance next to the least-overshoot one that has the smaller overshoot. */
export function bestStandardResistance(node: BareNode, capacitance: number, edge: number): StandardSnubber {
  const ideal = leastOvershootResistance(node, capacitance, edge)
  const { below, above } = neighboursOf(ideal, 'E24')
  const [first, second] = [below, above].map((resistance) => ({
    capacitance,
    resistance,
    overshoot: overshootOf(withSnubber(node, resistance, capacitance), edge),
  })) as [StandardSnubber, StandardSnubber]
  return first.overshoot <= second.overshoot ? first : second
}

/** An E12 capacitance for each worthwhile ratio with its best E24 resistance, least overshoot first. */
export function standardSnubbers(node: BareNode, edge: number): readonly StandardSnubber[] {
  const capacitances = new Set(
    worthwhileRatios.map((ratio) => nearestByRatio(ratio * node.capacitance, 'E12')),
  )
  return [...capacitances]
    .map((capacitance) => bestStandardResistance(node, capacitance, edge))
    .sort((a, b) => a.overshoot - b.overshoot)
}

/** The capacitance to begin with: the E12 value nearest to 3 Cpar, where the optimum is flat and near Z0. */
export const usualCapacitance = (node: BareNode): number => nearestByRatio(3 * node.capacitance, 'E12')
