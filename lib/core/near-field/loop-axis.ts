/**
 * The magnetic field on the axis of a circular loop, in A/m:
 *
 *     H = I a² / (2 (a² + z²)^(3/2))
 *
 * Amperes, metres; z from the plane of the loop. Exact for a thin wire and a wavelength far above a and z. Source:
 * Biot and Savart; any textbook of electromagnetism.
 */
export const loopAxisField = (current: number, radius: number, z: number): number =>
  (current * radius ** 2) / (2 * Math.hypot(radius, z) ** 3)
