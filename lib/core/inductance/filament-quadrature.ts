import { filamentPotential } from './filament-potential'
import { cross, difference, dot, norm, scaled, sum, type Point3 } from '../linear/point'
import { potentialAlong } from './potential-along'

/** A straight filament as its start, its direction of length 1, and its length. Metres. */
export type Filament = { readonly start: Point3; readonly direction: Point3; readonly length: number }

/**
 * ∬ cos ε ds dt / R of two filaments, by quadrature along the first of the exact potential of the second, metres: for
 * lines so nearly parallel that the closed form loses digits. The first is broken where the ends of the second are
 * beside it, and where the lines come nearest.
 */
export function filamentQuadrature(first: Filament, second: Filament): number {
  const cosine = dot(first.direction, second.direction)
  const fromSecond = difference(first.start, second.start)
  const potentialAt = (at: number): number => {
    const along = dot(fromSecond, second.direction) + at * cosine
    const seen = sum(fromSecond, scaled(first.direction, at))
    const aside = norm(difference(seen, scaled(second.direction, along)))
    return filamentPotential(along, second.length - along, aside)
  }
  return cosine * potentialAlong(first.length, breaksOf(first, second, cosine), potentialAt)
}

function breaksOf(first: Filament, second: Filament, cosine: number): readonly number[] {
  const toSecond = difference(second.start, first.start)
  const startBeside = dot(toSecond, first.direction)
  const endBeside = startBeside + second.length * cosine
  const sine = norm(cross(first.direction, second.direction))
  const foot = (startBeside - cosine * dot(toSecond, second.direction)) / sine ** 2
  return [startBeside, endBeside, foot]
}
