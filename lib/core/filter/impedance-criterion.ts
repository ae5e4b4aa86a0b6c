/**
 * How far the peak of a filter's output impedance stays below the incremental input resistance of the converter behind
 * it. At constant power dV/dI = −V²/P; the loop is stable with room where |Z_out| ≪ V²/P.
 *
 * Volts, watts, ohms; the margin in dB is 20 lg((V²/P)/|Z_out|). Source: R. D. Middlebrook, 1976 (from memory).
 */
export function impedanceCriterion(
  inputVoltage: number,
  inputPower: number,
  peakImpedance: number,
): { readonly incrementalResistance: number; readonly margin: number } {
  const resistance = inputVoltage ** 2 / inputPower
  return { incrementalResistance: -resistance, margin: 20 * Math.log10(resistance / peakImpedance) }
}
