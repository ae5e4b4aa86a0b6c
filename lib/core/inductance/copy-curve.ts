import type { Polygon } from './polygon'
import { mutualWithCopy } from './polygon-loop'

const points = 10

/**
 * The mutual inductance of a loop and its copy as a function of their distance, for many distances: through ten values in
 * each octave of it, found when first asked for. Within 1e-6 of the sum over all pairs.
 */
export function copyCurve(polygon: Polygon): (distance: number) => number {
  const octaves = new Map<number, readonly number[]>()
  return (distance) => {
    const position = Math.log2(distance)
    const octave = Math.floor(position)
    const known = octaves.get(octave) ?? valuesIn(polygon, octave)
    octaves.set(octave, known)
    return interpolated(known, position - octave)
  }
}

/** Chebyshev points of the second kind within 0…1. */
const placeOf = (index: number): number => (1 - Math.cos((Math.PI * index) / (points - 1))) / 2

const valuesIn = (polygon: Polygon, octave: number): readonly number[] =>
  Array.from({ length: points }, (_, index) => mutualWithCopy(polygon, 2 ** (octave + placeOf(index))))

/** Barycentric interpolation. Source: J.-P. Berrut, L. N. Trefethen, SIAM Review 46 (2004) 501 (from memory). */
function interpolated(values: readonly number[], at: number): number {
  let [above, below] = [0, 0]
  for (const [index, value] of values.entries()) {
    const away = at - placeOf(index)
    if (away === 0) return value
    const end = index === 0 || index === points - 1 ? 0.5 : 1
    const weight = ((index % 2 === 0 ? 1 : -1) * end) / away
    above += weight * value
    below += weight
  }
  return above / below
}
