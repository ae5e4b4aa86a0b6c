/**
 * The corner that an LC stage needs for an attenuation of `attenuation` dB at `frequency`:
 *
 *     asymptotic, 40 dB a decade:  fc = f 10^(−A/40);   exact, undamped and unloaded:  fc = f/√(1 + 10^(A/20))
 *
 * Hertz in and out. The exact one is lower. Source and load impedance and parasitics are not included.
 */
export function cornerFor(attenuation: number, frequency: number): { asymptotic: number; exact: number } {
  return {
    asymptotic: frequency * 10 ** (-attenuation / 40),
    exact: frequency / Math.sqrt(1 + 10 ** (attenuation / 20)),
  }
}

export type DampedFilter = {
  readonly characteristicImpedance: number
  readonly resistance: number
  readonly capacitance: number
  readonly peakImpedance: number
  readonly peakFrequency: number
}

/**
 * The best parallel R_d–C_d damping of an LC filter for a given n = C_d/C, by the least peak of its output impedance:
 *
 *     R_d/R₀ = √((2 + n)(4 + 3n)/(2n²(4 + n))),   |Z|max/R₀ = √(2(2 + n))/n   at f₀ √(2/(2 + n)),   R₀ = √(L/C)
 *
 * After R. D. Middlebrook; checked by direct minimisation. Henries, farads; n > 0.
 */
export function optimalDamping(inductance: number, capacitance: number, n: number): DampedFilter {
  const r0 = Math.sqrt(inductance / capacitance)
  const f0 = 1 / (2 * Math.PI * Math.sqrt(inductance * capacitance))
  return {
    characteristicImpedance: r0,
    resistance: r0 * Math.sqrt(((2 + n) * (4 + 3 * n)) / (2 * n * n * (4 + n))),
    capacitance: n * capacitance,
    peakImpedance: (r0 * Math.sqrt(2 * (2 + n))) / n,
    peakFrequency: f0 * Math.sqrt(2 / (2 + n)),
  }
}
