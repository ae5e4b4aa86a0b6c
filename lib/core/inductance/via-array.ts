import { err, ok, type Result } from '../result'
import { alignedFilaments } from './parallel-filaments'
import type { Point2 } from '../linear/point'
import { refusal, type InductanceRefusal } from './refusal'
import { tubeSelf } from './round-conductor'
import { solvePositive } from './solve-positive'

/** Equal vias side by side that join the same two conductors. Metres. */
export type ViaArray = {
  readonly length: number
  readonly diameter: number
  readonly positions: readonly Point2[]
}

export type ViaArrayInductance = {
  /** Partial inductance of one via alone, henries. */
  readonly single: number
  /** Partial inductance of all together, henries. */
  readonly effective: number
  /** How many times more that is than one via divided by their number. */
  readonly ratioToShare: number
  /** What part of the current each carries; they add up to 1. */
  readonly shares: readonly number[]
}

/**
 * Partial inductance of vias in parallel, all with the same voltage along them: L = 1/(1ᵀ 𝓛⁻¹ 1), where 𝓛 has the
 * exact tube on its diagonal and the mutual inductance of the axes elsewhere. Current crowds to the outer vias. Within
 * 0.3 % for vias at least three diameters apart. The return is elsewhere: its distance decides the loop.
 * Source: A. E. Ruehli, IBM J. Res. Dev. 16 (1972) 470, for the matrix of partial inductances.
 */
export function viaArray({
  length,
  diameter,
  positions,
}: ViaArray): Result<ViaArrayInductance, InductanceRefusal> {
  if (positions.length === 0) return err(refusal('too_few_points', 'An array needs at least one via.'))
  const meeting = viasThatMeet(positions, diameter)
  if (meeting !== null) {
    const [i, j] = meeting
    return err(refusal('overlap', `Vias ${i} and ${j} touch: their middles must be more than d apart.`))
  }
  const single = tubeSelf(length, diameter / 2)
  const matrix = positions.map((a, i) => mutualsOf(a, positions.slice(0, i), length, single))
  const currents = solvePositive(matrix, new Float64Array(positions.length).fill(1))
  const total = currents.reduce((sum, current) => sum + current, 0)
  if (!(total > 0)) return err(refusal('out_of_range', 'The vias are too near each other for this model.'))
  const effective = single / total
  return ok({
    single,
    effective,
    ratioToShare: (effective * positions.length) / single,
    shares: Array.from(currents, (current) => current / total),
  })
}

/** A row of the matrix up to its diagonal, which is all that the solver reads, in parts of one via alone. */
function mutualsOf(via: Point2, before: readonly Point2[], length: number, single: number): Float64Array {
  const row = new Float64Array(before.length + 1).fill(1)
  for (const [j, other] of before.entries()) row[j] = alignedFilaments(length, spacingOf(via, other)) / single
  return row
}

const spacingOf = (a: Point2, b: Point2): number => Math.sqrt((a[0] - b[0]) ** 2 + (a[1] - b[1]) ** 2)

function viasThatMeet(positions: readonly Point2[], diameter: number): readonly [number, number] | null {
  for (const [i, a] of positions.entries()) {
    for (const [j, b] of positions.slice(0, i).entries()) {
      if (!(spacingOf(a, b) > diameter)) return [j + 1, i + 1]
    }
  }
  return null
}
