/**
 * ∫ ds/R along a straight filament, seen from a point: ln((R₀ + R₁ + l)/(R₀ + R₁ − l)) = 2 atanh(l/(R₀ + R₁)).
 * The difference below the line is built from terms that do not cancel, however near the point is.
 *
 * @param behind distance along the filament from its start to the foot of the point
 * @param ahead distance along it from the foot to its end; behind + ahead = l
 * @param aside distance of the point from the line of the filament
 * @returns a pure number; infinite only on the filament itself.
 */
export function filamentPotential(behind: number, ahead: number, aside: number): number {
  const fromStart = Math.hypot(behind, aside)
  const toEnd = Math.hypot(ahead, aside)
  const excess = pastFoot(behind, fromStart, aside) + pastFoot(ahead, toEnd, aside)
  return Math.log1p((2 * (behind + ahead)) / excess)
}

/** R − x for a leg of length x along the line, without cancellation. */
const pastFoot = (along: number, distance: number, aside: number): number =>
  along > 0 ? (aside / (distance + along)) * aside : distance - along
