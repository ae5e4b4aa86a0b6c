import { speedOfLight, vacuumPermeability } from '../physics/constants'

/** Magnitudes of the field of a small loop, at a distance r and an angle θ from its axis. */
export type DipoleField = {
  /** Along the line of sight, A/m. */
  readonly radial: number
  /** Across it, A/m. */
  readonly transverse: number
  /** Around the axis, V/m. */
  readonly electric: number
  /** k r = 2π r/λ: below 1 in the near field. */
  readonly kr: number
}

/**
 * The field of a small current loop as a magnetic dipole m = I A in free space, near and far, k = 2π f/c:
 *
 *     H_r = m cos θ √(1 + (kr)²)/(2π r³),   H_θ = m sin θ √((1 − (kr)²)² + (kr)²)/(4π r³)
 *     E_φ = ω µ₀ m sin θ √(1 + (kr)²)/(4π r²)
 *
 * Amperes, square metres, hertz, metres, radians. Valid for a loop that is small against r and λ. Source: C. A. Balanis,
 * Antenna Theory (from memory); checked against retarded potentials of a ring of current.
 */
export function magneticDipole(
  moment: number,
  frequency: number,
  distance: number,
  angle: number,
): DipoleField {
  const omega = 2 * Math.PI * frequency
  const kr = (omega * distance) / speedOfLight
  // cos(90°) is not 0 in floating point; there the radial field is nothing but rounding.
  const cosine = Math.abs(Math.cos(angle)) < 1e-15 ? 0 : Math.abs(Math.cos(angle))
  const sine = Math.abs(Math.sin(angle)) < 1e-15 ? 0 : Math.abs(Math.sin(angle))
  const size = Math.abs(moment)
  return {
    radial: (size * cosine * Math.hypot(1, kr)) / (2 * Math.PI * distance ** 3),
    transverse: (size * sine * Math.hypot(1 - kr ** 2, kr)) / (4 * Math.PI * distance ** 3),
    electric: (omega * vacuumPermeability * size * sine * Math.hypot(1, kr)) / (4 * Math.PI * distance ** 2),
    kr,
  }
}
