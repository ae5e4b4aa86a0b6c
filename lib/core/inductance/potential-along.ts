import { tanhSinh } from './tanh-sinh'

/**
 * The integral of a filament's potential from 0 to a length along a line, broken at the places given, of which those
 * outside are left out. Where filaments touch, the last nodes may round onto the other one; they have no weight to
 * speak of, and count as nothing.
 */
export function potentialAlong(
  length: number,
  breaks: readonly number[],
  potentialAt: (at: number) => number,
): number {
  const finite = (at: number): number => {
    const potential = potentialAt(at)
    return Number.isFinite(potential) ? potential : 0
  }
  const inside = breaks.filter((at) => at > 0 && at < length).sort((a, b) => a - b)
  const ends = [0, ...inside, length]
  return ends.slice(1).reduce((total, end, index) => total + tanhSinh(ends[index] ?? end, end, finite), 0)
}
