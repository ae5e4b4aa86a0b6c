import { filamentPotential } from './filament-potential'

/**
 * Two straight filaments in the coordinates of Campbell: each runs along its own line, counted from the foot of the
 * common perpendicular of both lines. Metres.
 */
export type SkewPair = {
  /** First line: from p0 to p1 > p0. */
  readonly p0: number
  readonly p1: number
  /** Second line: from q0 to q1 > q0. */
  readonly q0: number
  readonly q1: number
  /** Cosine and sine of the angle between the two directions; the sine is above 0. */
  readonly cosine: number
  readonly sine: number
  /** Length of the common perpendicular. */
  readonly apart: number
}

/**
 * The Neumann integral ∬ cos ε ds dt / R of two skew filaments in closed form, metres (times µ₀/4π it is M):
 *
 *     cos ε · { p₁V₂(p₁) − p₀V₂(p₀) + q₁V₁(q₁) − q₀V₁(q₀) − Ω d/sin ε }
 *
 * with V the potential of the other filament at an end, and Ω the solid angle as four arc tangents. Loses 1/sin² ε of
 * its digits as the lines become parallel. Source: G. A. Campbell, Physical Review 5 (1915) 452 (from memory);
 * F. W. Grover, Inductance Calculations, 1946, chapter 7 (from memory).
 */
export function skewClosedForm(pair: SkewPair): number {
  const { p0, p1, q0, q1, cosine, sine, apart } = pair
  const ends =
    endTerm(p1, q0, q1, pair) -
    endTerm(p0, q0, q1, pair) +
    endTerm(q1, p0, p1, pair) -
    endTerm(q0, p0, p1, pair)
  if (apart === 0) return cosine * ends
  const angle = corner(p1, q1, pair) - corner(p1, q0, pair) - corner(p0, q1, pair) + corner(p0, q0, pair)
  return cosine * (ends - (angle * apart) / sine)
}

/** x V(x): an end at x on one line, in the potential of the filament from `start` to `end` on the other; 0 on it. */
function endTerm(x: number, start: number, end: number, { cosine, sine, apart }: SkewPair): number {
  const potential = filamentPotential(x * cosine - start, end - x * cosine, Math.hypot(apart, x * sine))
  return Number.isFinite(potential) ? x * potential : 0
}

function corner(p: number, q: number, { cosine, sine, apart }: SkewPair): number {
  const distance = Math.sqrt(apart ** 2 + (p - q * cosine) ** 2 + (q * sine) ** 2)
  return Math.atan2(apart ** 2 * cosine + p * q * sine ** 2, apart * distance * sine)
}
