import { vacuumPermeability } from '../physics/constants'
import { gaussLegendre, gaussRule } from './gauss-legendre'
import { parallelFilaments } from './parallel-filaments'
import { tanhSinh } from './tanh-sinh'

/** A straight bar of rectangular section; current runs along its length. Metres. */
export type Bar = { readonly width: number; readonly thickness: number; readonly length: number }

/** From one corner of the first bar to the like corner of the second. Metres. */
export type BarOffset = { readonly across: number; readonly up: number; readonly along: number }

/**
 * Partial self-inductance of a bar with even current, henries: the mean of the filament formula over all pairs of
 * points of the section,
 *
 *     L = 4/(w²t²) ∫₀ʷ∫₀ᵗ (w − x)(t − y) M(l, √(x² + y²)) dy dx
 *
 * It is the value of the closed form of 64 terms, without its loss of digits for long thin bars; to about 1e-11 for any
 * shape. The rectangle is cut along its diagonal, so that the logarithm sits where the rule is made for it.
 * Source: C. Hoer, C. Love, J. Res. NBS 69C (1965) 127; A. E. Ruehli, IBM J. Res. Dev. 16 (1972) 470.
 */
export function barSelf({ width, thickness, length }: Bar): number {
  const wedge = (near: number, far: number): number =>
    tanhSinh(0, 1, (_, slope) => wedgeAlong(length, Math.hypot(near, far * slope), slope))
  return (vacuumPermeability / Math.PI) * 2 * (wedge(width, thickness) + wedge(thickness, width))
}

/**
 * ∫₀¹ u (1 − u)(1 − su) M(l, hu) du · 2π/µ₀ along one ray of a wedge. The part − l ln u of the filament formula is
 * integrated in closed form; the rest is smooth for a bar longer than the ray.
 */
function wedgeAlong(length: number, reach: number, slope: number): number {
  const [p, logarithm] = [length / reach, 1 / 4 - (1 + slope) / 9 + slope / 16]
  const rest = (u: number): number => {
    const distance = Math.sqrt(p * p + u * u)
    return u * (1 - u) * (1 - slope * u) * (Math.log(p + distance) - p / (distance + u))
  }
  return length * (logarithm + (p > 1.5 ? gaussLegendre(rayRule, 0, 1, rest) : tanhSinh(0, 1, rest)))
}

const rayRule = gaussRule(14)

/**
 * The usual approximation for a bar, henries: L = (µ₀ l/2π) [ln(2l/(w + t)) + ½ + 0.2235 (w + t)/l]. Within 0.1 % at
 * l/w = 20, 0.4 % at 5; 7 % low at 0.5. Source: E. B. Rosa 1908, F. W. Grover 1946 (from memory).
 */
export function barSelfApproximate({ width, thickness, length }: Bar): number {
  const girth = width + thickness
  const bracket = Math.log((2 * length) / girth) + 1 / 2 + (0.2235 * girth) / length
  return ((vacuumPermeability * length) / (2 * Math.PI)) * bracket
}

/**
 * Mutual inductance of two parallel bars with even current, henries: the exact filament formula, weighted with how often
 * each distance occurs between the sections. Bars may lie side by side, touch, or share space. To about 1e-10.
 * Source: C. Hoer, C. Love, J. Res. NBS 69C (1965) 127.
 */
export function barMutual(first: Bar, second: Bar, offset: BarOffset): number {
  const acrossPieces = piecesOf(first.width, second.width, offset.across)
  const upPieces = piecesOf(first.thickness, second.thickness, offset.up)
  const filaments = (distance: number): number =>
    parallelFilaments({ length1: first.length, length2: second.length, distance, offset: offset.along })
  const integral = areApart(first, second, offset) ? farIntegral : tanhSinh
  const cells = acrossPieces.flatMap((x) => upPieces.map((y) => cellMean(x, y, filaments, integral)))
  return cells.reduce((sum, cell) => sum + cell, 0)
}

/** Distances from `from` to `to` along one axis, whose density goes straight from `atFrom` to `atTo`. */
type Piece = { readonly from: number; readonly to: number; readonly density: (distance: number) => number }

/** The pieces of the trapezium that is the density of the distances between two lines, cut at 0 as well. */
function piecesOf(first: number, second: number, offset: number): readonly Piece[] {
  const density = (distance: number): number => {
    const overlap = Math.min(first, offset + second - distance) - Math.max(0, offset - distance)
    return Math.max(0, overlap) / (first * second)
  }
  const [least, most] = [offset - first, offset + second]
  const corners = [least, offset, offset + second - first, most, ...(least < 0 && most > 0 ? [0] : [])]
  const ends = [...new Set(corners)].sort((a, b) => a - b)
  return ends.slice(1).map((to, index) => ({ from: ends[index] ?? to, to, density }))
}

type Integral = (start: number, end: number, f: (x: number) => number) => number

const farRule = gaussRule(12)

const farIntegral: Integral = (start, end, f) => gaussLegendre(farRule, start, end, f)

/** Whether the bars are farther apart than their sections are wide: then the mutual inductance varies smoothly. */
function areApart(first: Bar, second: Bar, { across, up, along }: BarOffset): boolean {
  const gap = Math.hypot(
    gapOf(first.width, second.width, across),
    gapOf(first.thickness, second.thickness, up),
    gapOf(first.length, second.length, along),
  )
  return gap >= Math.max(first.width, first.thickness, second.width, second.thickness)
}

const gapOf = (first: number, second: number, offset: number): number =>
  Math.max(0, offset - first, -offset - second)

function cellMean(x: Piece, y: Piece, filaments: (distance: number) => number, integral: Integral): number {
  return integral(x.from, x.to, (across) => {
    const weight = x.density(across)
    if (!(weight > 0)) return 0
    return weight * integral(y.from, y.to, (up) => y.density(up) * filaments(Math.hypot(across, up)))
  })
}
