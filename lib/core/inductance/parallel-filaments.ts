import { vacuumPermeability } from '../physics/constants'
import { filamentPotential } from './filament-potential'
import { potentialAlong } from './potential-along'

/** Two parallel straight filaments that carry current the same way. Metres. */
export type ParallelFilaments = {
  readonly length1: number
  readonly length2: number
  /** Between their lines. */
  readonly distance: number
  /** Along the lines, from the start of the first to the start of the second. */
  readonly offset: number
}

const perFourPi = vacuumPermeability / (4 * Math.PI)

/**
 * Mutual inductance of two equal filaments side by side, henries:
 *
 *     M = (µ₀/2π) [l asinh(l/d) − √(l² + d²) + d]
 *
 * Source: F. W. Grover, Inductance Calculations, 1946, chapter 5 (from memory).
 */
export const alignedFilaments = (length: number, distance: number): number =>
  2 *
  perFourPi *
  length *
  (Math.asinh(length / distance) - length / (Math.sqrt(length * length + distance * distance) + distance))

/**
 * Mutual inductance of parallel filaments of lengths l, m at distance d whose starts are D apart, henries:
 *
 *     M = (µ₀/4π) [F(l − D) − F(l − D − m) − F(−D) + F(m + D)],   F(x) = x asinh(x/d) − √(x² + d²)
 *
 * and F(x) = |x| (ln|x| − 1) on one line. Where the four terms would cancel, the potential of the longer one is
 * integrated along the shorter one instead. Infinite, so the caller refuses, where they overlap on one line.
 * Source: F. W. Grover, Inductance Calculations, 1946, chapters 5 and 6 (from memory).
 */
export function parallelFilaments(pair: ParallelFilaments): number {
  if (areOverlapping(pair)) return Number.POSITIVE_INFINITY
  const { length1, length2, distance, offset } = pair
  const corners = [length1 - offset, length1 - offset - length2, -offset, -offset - length2] as const
  const terms = corners.map((x) => corner(x, distance))
  const [first = 0, second = 0, third = 0, fourth = 0] = terms
  const sum = first - second - third + fourth
  const scale = Math.max(...terms.map(Math.abs))
  return perFourPi * (Math.abs(sum) > 1e-3 * scale ? sum : alongTheShorter(pair))
}

/** Two filaments on one line that share more than an end, by more than what coordinates are rounded to. */
export function areOverlapping({ length1, length2, distance, offset }: ParallelFilaments): boolean {
  const shared = Math.min(length1, offset + length2) - Math.max(0, offset)
  return distance === 0 && shared > 1e-12 * (length1 + length2 + Math.abs(offset))
}

function corner(x: number, distance: number): number {
  if (distance > 0) return x * Math.asinh(x / distance) - Math.hypot(x, distance)
  return x === 0 ? 0 : Math.abs(x) * (Math.log(Math.abs(x)) - 1)
}

function alongTheShorter({ length1, length2, distance, offset }: ParallelFilaments): number {
  if (length2 > length1) {
    return alongTheShorter({ length1: length2, length2: length1, distance, offset: -offset })
  }
  return potentialAlong(length2, [-offset, length1 - offset], (at) =>
    filamentPotential(offset + at, length1 - offset - at, distance),
  )
}
