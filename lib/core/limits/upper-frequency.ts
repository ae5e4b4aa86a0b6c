/** Highest internal frequency up to which a range ends, and where it ends, in Hz. */
const steps = [
  [1.705e6, 30e6],
  [108e6, 1e9],
  [500e6, 2e9],
  [1e9, 5e9],
] as const

/**
 * Up to which frequency an unintentional radiator is measured, from the highest frequency that it generates or uses, in Hz:
 * below 1.705 MHz to 30 MHz, to 108 MHz to 1 GHz, to 500 MHz to 2 GHz, to 1 GHz to 5 GHz, above to the fifth harmonic or
 * 40 GHz, whichever is lower.
 *
 * Source: 47 CFR 15.33(b)(1), read in a public copy.
 */
export function upperMeasurementFrequency(highest: number): number {
  const [first, ...others] = steps
  if (highest < first[0]) return first[1]
  const step = others.find(([upTo]) => highest <= upTo)
  return step ? step[1] : Math.min(5 * highest, 40e9)
}
