import { err, ok, type Result } from '../result'

/** What stands at the leakage inductance of a flyback transformer when its switch opens; SI units. */
export type ClampedLeakage = {
  readonly leakage: number
  readonly peakCurrent: number
  readonly frequency: number
  /** Of the clamp capacitor, above the input rail. */
  readonly clampVoltage: number
  /** Of the output with its rectifier drop, times the turns ratio Np/Ns. */
  readonly reflectedVoltage: number
}

export type ClampDuty = { readonly resetTime: number; readonly power: number; readonly resistance: number }

/**
 * The duty of an RCD clamp from the linear reset of the leakage current:
 *
 *     t_s = L I/(Vc − nVo),   P = ½ L I² f Vc/(Vc − nVo),   R = Vc²/P
 *
 * Neglects Coss and the recovery of the diode, which both lower P. Error: `no_reset` unless Vc > nVo.
 */
export function clampDuty(given: ClampedLeakage): Result<ClampDuty, { readonly code: 'no_reset' }> {
  const { leakage, peakCurrent, frequency, clampVoltage, reflectedVoltage } = given
  const excess = clampVoltage - reflectedVoltage
  // A difference of rounding errors is none.
  if (!(excess > 1e-12 * clampVoltage)) return err({ code: 'no_reset' })
  const resetTime = (leakage * peakCurrent) / excess
  const power = (clampVoltage * peakCurrent * resetTime * frequency) / 2
  return ok({ resetTime, power, resistance: clampVoltage ** 2 / power })
}

/** The clamp capacitor for a peak-to-peak ripple: C = Vc/(ΔV R f), in farads. */
export const clampCapacitance = (
  voltage: number,
  ripple: number,
  resistance: number,
  frequency: number,
): number => voltage / (ripple * resistance * frequency)
