import { vacuumPermeability } from '../physics/constants'
import { alignedFilaments } from './parallel-filaments'
import { tanhSinh } from './tanh-sinh'

const perTwoPi = vacuumPermeability / (2 * Math.PI)

/**
 * Partial self-inductance of a straight tube, or of a round wire with all current on its surface, henries: the mutual
 * inductance of two filaments, averaged over all pairs on the circle,
 *
 *     L = (1/π) ∫₀^π M(l, 2a sin(φ/2)) dφ
 *
 * Exact for current that is even around and along the wire. Any ratio of length to radius. Derived here.
 */
export const tubeSelf = (length: number, radius: number): number =>
  tanhSinh(0, Math.PI, (_, angle) => alignedFilaments(length, 2 * radius * Math.sin(angle / 2))) / Math.PI

/**
 * Partial self-inductance of a straight round wire with even current over its section, henries: the mean over the
 * distances s of two points of a disc, whose density is (4s/πa²) [arccos(s/2a) − (s/2a) √(1 − s²/4a²)]. Exact for any
 * ratio of length to radius. Derived here.
 */
export function solidRoundSelf(length: number, radius: number): number {
  const mean = tanhSinh(0, Math.PI / 2, (_, angle, rest) => {
    const distance = 2 * radius * Math.sin(angle)
    const density = 16 * Math.sin(angle) * Math.cos(angle) * (rest - Math.sin(angle) * Math.cos(angle))
    return density * alignedFilaments(length, distance)
  })
  return mean / Math.PI
}

/** The tube when long against its radius: L = (µ₀ l/2π) (ln(2l/a) − 1), low by (4/π) a/l in the bracket. */
export const longTubeSelf = (length: number, radius: number): number =>
  perTwoPi * length * (Math.log((2 * length) / radius) - 1)

/**
 * The even current when long: L = (µ₀ l/2π) (ln(2l/a) − ¾), low by 0.9054 a/l in the bracket.
 * Source: E. B. Rosa, Bulletin of the Bureau of Standards 4 (1908) 301 (from memory).
 */
export const longSolidSelf = (length: number, radius: number): number =>
  perTwoPi * length * (Math.log((2 * length) / radius) - 3 / 4)

/** Geometric mean distance of the points of a circle, and of a disc, to each other: a and a e^(−¼). */
export const surfaceMeanDistance = (radius: number): number => radius
export const solidMeanDistance = (radius: number): number => radius * Math.exp(-1 / 4)
