import { completeDifference } from '../elliptic/complete-integrals'
import { vacuumPermeability } from '../physics/constants'

/**
 * Mutual inductance of two circles a and b on one axis, z apart, henries:
 *
 *     M = µ₀ √(ab) [(2/k − k) K(k) − (2/k) E(k)],   k² = 4ab / ((a + b)² + z²)
 *
 * Infinite for a = b at z = 0. Without loss of digits for circles far apart. Source: J. C. Maxwell, A Treatise on
 * Electricity and Magnetism, art. 701 (from memory); NIST DLMF 19.34.
 */
export function coaxialCircles(a: number, b: number, z: number): number {
  const far = Math.hypot(a + b, z)
  const modulus = (2 * Math.sqrt(a) * Math.sqrt(b)) / far
  const complement = Math.hypot(a - b, z) / far
  if (complement === 0) return Number.POSITIVE_INFINITY
  const bracket = (2 / modulus) * completeDifference(modulus, complement)
  return vacuumPermeability * Math.sqrt(a) * Math.sqrt(b) * bracket
}

/**
 * The flux of a filament at the middle of a wire through the circle along the wire's inner edge, M(a, a − r), henries.
 * It is often given for the self-inductance of a ring, but is 3 to 11 % low at r/a = 0.05 to 0.2: for comparison.
 */
export const fluxThroughInnerEdge = (radius: number, wireRadius: number): number =>
  coaxialCircles(radius, radius - wireRadius, 0)
