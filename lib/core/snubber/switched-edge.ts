import { rootsOf } from '../linear/roots'
import { edgeResponse, squareIntegral, valueOf, type EdgeResponse } from './edge-response'
import { peakMagnitudeOf, peakOf, riseTimeOf } from './edge-measures'
import { leastDamping, polesOf, ringFrequency } from './modes'
import { angularFrequency, characteristicImpedance, normalise, type SwitchNode } from './network'

/** A straight edge of the source: from `from` by `step` volts (either sign) in `duration` seconds, 0 to 100 %. */
export type Edge = { readonly from: number; readonly step: number; readonly duration: number }

/** What one fully settled edge does, in SI units. */
export type EdgeOutcome = {
  readonly peak: number
  readonly overshoot: number
  readonly dampingRatio: number
  readonly ringFrequency: number | null
  readonly snubberEnergy: number
  readonly seriesEnergy: number
  readonly snubberPeakCurrent: number
}

/**
 * The exact response of the switch node to one edge: peak, overshoot as a fraction of the step, and the energy turned
 * into heat in each resistance. Energies are ∫ i² R dt of the exact currents; together they are ½ (Cs + Cpar) V² for an
 * ideal step and less for a slower edge.
 */
export function switchEdge(node: SwitchNode, edge: Edge): EdgeOutcome {
  const omega = angularFrequency(node)
  const z0 = characteristicImpedance(node)
  const network = normalise(node)
  const poles = rootsOf(network.denominator)
  const duration = edge.duration * omega
  const response = (numerator: readonly number[]) =>
    edgeResponse(numerator, network.denominator, duration, poles)
  const voltage = response(network.nodeVoltage)
  const snubber = response(network.snubberCurrent)
  const energyUnit = edge.step ** 2 * node.capacitance
  const overshoot = Math.max(0, peakOf(voltage, poles) - 1)
  return {
    peak: edge.from + edge.step * (1 + overshoot),
    overshoot,
    dampingRatio: leastDamping(node, poles),
    ringFrequency: ringFrequency(node, poles),
    snubberEnergy: node.snubber ? (energyUnit * squareIntegral(snubber) * node.snubber.resistance) / z0 : 0,
    seriesEnergy:
      node.seriesResistance === 0
        ? 0
        : (energyUnit * squareIntegral(response(network.sourceCurrent)) * node.seriesResistance) / z0,
    snubberPeakCurrent: node.snubber ? (peakMagnitudeOf(snubber, poles) * Math.abs(edge.step)) / z0 : 0,
  }
}

/** The time from 10 to 90 % of the step at the switch node, by first crossings, in seconds. */
export function nodeRiseTime(node: SwitchNode, edge: Edge): number {
  const omega = angularFrequency(node)
  const { nodeVoltage, denominator } = normalise(node)
  return riseTimeOf(edgeResponse(nodeVoltage, denominator, edge.duration * omega), polesOf(node)) / omega
}

/** The node voltage at the given times (seconds from the beginning of the edge), in volts. */
export function nodeVoltageAt(node: SwitchNode, edge: Edge, times: readonly number[]): readonly number[] {
  const omega = angularFrequency(node)
  const { nodeVoltage, denominator } = normalise(node)
  const response: EdgeResponse = edgeResponse(nodeVoltage, denominator, edge.duration * omega)
  return times.map((time) => edge.from + edge.step * valueOf(response, time * omega))
}
