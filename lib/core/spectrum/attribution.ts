import { quantityText } from '../units/format-quantity'
import { candidatesOf, clashesOf, reachOf } from './comb'
import type { CombCandidate, CombClash, CombSource, CombTolerance } from './comb'

export type MeasuredPeak = { readonly frequency: number; readonly level: number }

/** A peak with all lines that it may be. */
export type AttributedPeak = MeasuredPeak & {
  readonly candidates: readonly CombCandidate[]
  readonly verdict: 'explained' | 'ambiguous' | 'unexplained'
}

/** Names every line that each peak may be. */
export const attributePeaks = (
  peaks: readonly MeasuredPeak[],
  sources: readonly CombSource[],
  tolerance: CombTolerance,
): readonly AttributedPeak[] =>
  peaks.map((peak) => {
    const candidates = candidatesOf(peak.frequency, sources, tolerance)
    const verdict =
      candidates.length === 0 ? 'unexplained' : candidates.length === 1 ? 'explained' : 'ambiguous'
    return { ...peak, candidates, verdict }
  })

/** "buck × 7". */
export const candidateText = ({ source, harmonic }: CombCandidate): string => `${source.name} × ${harmonic}`

/** A peak that so many lines match says nothing about pairs of them. */
const mostPaired = 20

/** The pairs of lines, over all peaks, that this resolution cannot tell apart; each pair once. */
export function allClashes(peaks: readonly AttributedPeak[], tolerance: CombTolerance): readonly CombClash[] {
  const found = new Map<string, CombClash>()
  for (const { candidates } of peaks) {
    if (candidates.length > mostPaired) continue
    for (const clash of clashesOf(candidates, tolerance)) {
      found.set(`${candidateText(clash.first)} / ${candidateText(clash.second)}`, clash)
    }
  }
  return [...found.values()]
}

/**
 * The measurement that would tell two lines apart: a resolution bandwidth narrower than what their spacing leaves beside
 * the tolerances of the sources, or sources measured or moved where their tolerances alone fill the spacing.
 */
export function separatingMeasurement(
  { first, second, spacing }: CombClash,
  tolerance: CombTolerance,
): string {
  const sourcesAlone = { ...tolerance, hertz: 0 }
  const left = spacing - reachOf(first, sourcesAlone) - reachOf(second, sourcesAlone)
  if (left > 0) return `measure with an RBW below ${quantityText(left, 'Hz', 3)}`
  if (spacing > 0) return 'measure the frequencies of both sources first, then compare with a narrow RBW'
  return 'no RBW separates them: move or stop one source, and see whether the peak follows'
}
