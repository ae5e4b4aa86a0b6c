import { neumannIntegral } from './filament-mutual'
import type { Filament } from './filament-quadrature'
import { gaussRule, type GaussRule } from './gauss-legendre'
import type { Side } from '../linear/point'

/** A side with what every pair asks of it: its middle, half of its way, half of its length. */
export type PlanarSide = {
  readonly x: number
  readonly y: number
  readonly halfX: number
  readonly halfY: number
  readonly half: number
  readonly filament: Filament
}

/** Copies of the outline, each displaced by a height normal to its plane, and how they count. */
export type Copy = { readonly height: number; readonly sign: 1 | -1 }

export function planarSide({ from, to }: Side): PlanarSide {
  const [halfX, halfY] = [(to[0] - from[0]) / 2, (to[1] - from[1]) / 2]
  const half = Math.hypot(halfX, halfY)
  const direction = [halfX / half, halfY / half, 0] as const
  const filament = { start: [from[0], from[1], 0] as const, direction, length: 2 * half }
  return { x: from[0] + halfX, y: from[1] + halfY, halfX, halfY, half, filament }
}

/**
 * A rule with n nodes errs by about ρ⁻²ⁿ, ρ + 1/ρ = 2z, where z is the distance of the nearest singularity in
 * half-lengths of the longer side: from this z on, the rule with n nodes errs by less than 1e-9.
 * Source: L. N. Trefethen, SIAM Review 50 (2008) 67, theorem 4.5 (from memory); checked against the closed form.
 */
const rules = [2, 3, 4, 5, 6, 8].map((count) => ({
  rule: gaussRule(count),
  from: Math.cosh(Math.log(1e9) / (2 * count)),
}))
const leastZ = rules[rules.length - 1]?.from ?? Number.POSITIVE_INFINITY

/**
 * Σ over the copies of ± ∬ cos ε ds dt / R between one side and the copy of the other, metres: by Gauss quadrature
 * where the sides are far apart for their lengths, else in closed form.
 */
export function planarPair(a: PlanarSide, b: PlanarSide, copies: readonly Copy[]): number {
  const product = a.halfX * b.halfX + a.halfY * b.halfY
  if (product === 0) return 0
  const [longer, shorter] = a.half >= b.half ? [a.half, b.half] : [b.half, a.half]
  const away = Math.sqrt((a.x - b.x) ** 2 + (a.y - b.y) ** 2)
  const z = (away - shorter) / longer
  if (z < leastZ) return closeBy(a, b, copies)
  const chosen = rules.find(({ from }) => z >= from)
  return chosen === undefined ? closeBy(a, b, copies) : product * farApart(a, b, copies, chosen.rule)
}

function closeBy(a: PlanarSide, b: PlanarSide, copies: readonly Copy[]): number {
  const [x, y] = b.filament.start
  return copies.reduce(
    (sum, { height, sign }) =>
      sum + sign * neumannIntegral(a.filament, { ...b.filament, start: [x, y, height] }),
    0,
  )
}

function farApart(a: PlanarSide, b: PlanarSide, copies: readonly Copy[], rule: GaussRule): number {
  const { nodes, weights } = rule
  let sum = 0
  for (let i = 0; i < nodes.length; i += 1) {
    const [s, weight] = [nodes[i] ?? 0, weights[i] ?? 0]
    const [dx, dy] = [a.x + s * a.halfX - b.x, a.y + s * a.halfY - b.y]
    for (let j = 0; j < nodes.length; j += 1) {
      const t = nodes[j] ?? 0
      const [awayX, awayY] = [dx - t * b.halfX, dy - t * b.halfY]
      const square = awayX * awayX + awayY * awayY
      const both = weight * (weights[j] ?? 0)
      for (const { height, sign } of copies) sum += (sign * both) / Math.sqrt(square + height * height)
    }
  }
  return sum
}
