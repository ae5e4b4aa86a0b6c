import { freeSpaceImpedance, speedOfLight, vacuumPermeability } from '../physics/constants'

/**
 * The largest far field of a small current loop in free space, V/m:
 *
 *     E = η₀ π f² A I / (c² r)
 *
 * Hertz, square metres, amperes, metres; rms gives rms. Valid for a perimeter below λ/4 and r above λ/2π.
 */
export const smallLoopField = (frequency: number, area: number, current: number, distance: number): number =>
  (freeSpaceImpedance * Math.PI * frequency ** 2 * area * current) / (speedOfLight ** 2 * distance)

/**
 * The largest far field of a short straight cable in free space that carries the same common-mode current all along,
 * V/m:
 *
 *     E = (µ₀/2) f I L / r
 *
 * I is the total current, as a clamp around the cable reads it. Valid for L below λ/4 and r above λ/2π.
 */
export const shortCableField = (
  frequency: number,
  length: number,
  current: number,
  distance: number,
): number => (vacuumPermeability * frequency * current * length) / (2 * distance)

/** λ in vacuum, in metres. */
export const wavelengthOf = (frequency: number): number => speedOfLight / frequency
