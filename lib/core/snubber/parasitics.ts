import { err, ok, type Result } from '../result'

export type Parasitics = {
  readonly capacitance: number
  readonly inductance: number
  readonly characteristicImpedance: number
}

/** f = f_damped/√(1 − ζ²), in hertz. Exact for one pair of poles; 0 ≤ ζ < 1. */
export const naturalFrequency = (dampedFrequency: number, dampingRatio: number): number =>
  dampedFrequency / Math.sqrt(1 - dampingRatio ** 2)

/**
 * Parasitics of a ringing node from its undamped frequency alone (f0) and with a known capacitance across it (f1):
 *
 *     Cpar = Cadd/((f0/f1)² − 1),   Lpar = 1/((2π f0)² Cpar),   Z0 = √(Lpar/Cpar)
 *
 * Hertz and farads in; farads, henries and ohms out. Error: `no_shift` unless f1 < f0.
 */
export function parasiticsFromShift(
  bareFrequency: number,
  loadedFrequency: number,
  addedCapacitance: number,
): Result<Parasitics, { readonly code: 'no_shift' }> {
  const ratio = bareFrequency / loadedFrequency
  if (!(ratio > 1)) return err({ code: 'no_shift' })
  const capacitance = addedCapacitance / (ratio ** 2 - 1)
  const inductance = 1 / ((2 * Math.PI * bareFrequency) ** 2 * capacitance)
  return ok({ capacitance, inductance, characteristicImpedance: Math.sqrt(inductance / capacitance) })
}

export type Decrement = {
  readonly logarithmicDecrement: number
  readonly dampingRatio: number
  readonly qualityFactor: number
}

/**
 * Damping from two peaks of the same sign n cycles apart, measured from the settled level:
 *
 *     δ = (1/n) ln(x0/xn),   ζ = δ/√(4π² + δ²),   Q = 1/(2ζ)
 *
 * Error: `not_decaying` unless the later peak is the smaller one and both are positive.
 */
export function decrementOf(
  firstPeak: number,
  laterPeak: number,
  cycles: number,
): Result<Decrement, { readonly code: 'not_decaying' }> {
  if (!(firstPeak > laterPeak && laterPeak > 0 && cycles > 0)) return err({ code: 'not_decaying' })
  const logarithmicDecrement = Math.log(firstPeak / laterPeak) / cycles
  const dampingRatio = logarithmicDecrement / Math.hypot(2 * Math.PI, logarithmicDecrement)
  return ok({ logarithmicDecrement, dampingRatio, qualityFactor: 1 / (2 * dampingRatio) })
}
