import type { Polynomial } from '../linear/polynomial'

/**
 * The switch node: a step source behind L and series R drives Cpar, with Rs in series with Cs across it.
 * All in SI; `snubber` absent is the bare node.
 */
export type SwitchNode = {
  readonly inductance: number
  readonly capacitance: number
  readonly seriesResistance: number
  readonly snubber?: { readonly resistance: number; readonly capacitance: number }
}

/** The characteristic impedance √(L/Cpar), in ohms. */
export const characteristicImpedance = (node: SwitchNode): number =>
  Math.sqrt(node.inductance / node.capacitance)

/** The angular frequency 1/√(L Cpar), in rad/s. */
export const angularFrequency = (node: SwitchNode): number =>
  1 / Math.sqrt(node.inductance * node.capacitance)

/**
 * Transfer functions from the source in normalised form (time in 1/ω0, resistance in Z0, current in V/Z0):
 *
 *     D(s) = kρ s³ + (1 + k + kρr) s² + (kρ + r(1 + k)) s + 1,   k = Cs/Cpar, ρ = Rs/Z0, r = R/Z0
 *     node voltage (1 + kρ s)/D,   snubber current k s/D,   source current s (1 + k + kρ s)/D
 */
export type NormalisedNetwork = {
  readonly denominator: Polynomial
  readonly nodeVoltage: Polynomial
  readonly snubberCurrent: Polynomial
  readonly sourceCurrent: Polynomial
}

export function normalise(node: SwitchNode): NormalisedNetwork {
  const z0 = characteristicImpedance(node)
  const r = node.seriesResistance / z0
  if (!node.snubber) {
    return { denominator: [1, r, 1], nodeVoltage: [1], snubberCurrent: [0], sourceCurrent: [0, 1] }
  }
  const k = node.snubber.capacitance / node.capacitance
  const kRho = (k * node.snubber.resistance) / z0
  return {
    denominator: [1, kRho + r * (1 + k), 1 + k + kRho * r, kRho],
    nodeVoltage: [1, kRho],
    snubberCurrent: [0, k],
    sourceCurrent: [0, 1 + k, kRho],
  }
}
