/** How a field falls with distance: 20 dB a decade in the far field, 40 dB a decade in the near field of a loop. */
export type DistanceRule = 20 | 40

/** The rule of 47 CFR 15.31(f): (1) 20 dB a decade at and above 30 MHz, (2) 40 dB a decade below. */
export const distanceRuleAt = (frequency: number): DistanceRule => (frequency >= 30e6 ? 20 : 40)

/**
 * A field level carried to another distance: L + rule · lg(d_from/d_to). Distances in metres, above 0.
 *
 * From 3 m to 10 m the far field falls by 10.46 dB; the tables of CISPR take a rounded 10 dB. Below 30 MHz two distances
 * should be measured (15.31(f)(2)). Source: 47 CFR 15.31(f), read in a public copy.
 */
export const levelAtDistance = (level: number, from: number, to: number, rule: DistanceRule): number =>
  level + rule * Math.log10(from / to)
