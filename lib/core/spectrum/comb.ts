/** A source of harmonics: a switching converter, a clock. */
export type CombSource = {
  readonly name: string
  readonly frequency: number
  /** Of this source, in place of the common one. */
  readonly ppm?: number
}

/** A line of a source that a peak may be. */
export type CombCandidate = {
  readonly source: CombSource
  readonly harmonic: number
  /** The peak minus the harmonic, in Hz. */
  readonly deviation: number
}

export type CombTolerance = {
  /** Of the frequency of a source: oscillator tolerance and drift. */
  readonly ppm: number
  /** Of reading a peak, in Hz; at least half of the resolution bandwidth. */
  readonly hertz: number
  /** Harmonics above this one are not considered. */
  readonly mostHarmonic?: number
  /** Lines of one source for one peak; more than a few say nothing. 1000 where left out. */
  readonly mostPerSource?: number
}

/**
 * Every line that a peak may be, in the order of the sources: |p − h f| ≤ h f · ppm · 10⁻⁶ + tolerance, h ≥ 1. None is an
 * unexplained peak, several are an ambiguous one. Frequencies above 0 and tolerances from 0, in Hz and ppm.
 */
export function candidatesOf(
  peak: number,
  sources: readonly CombSource[],
  tolerance: CombTolerance,
): readonly CombCandidate[] {
  const found: CombCandidate[] = []
  for (const source of sources) {
    const { frequency } = source
    const share = (source.ppm ?? tolerance.ppm) * 1e-6
    const first = Math.max(1, Math.floor((peak - tolerance.hertz) / (frequency * (1 + share))))
    const end = share < 1 ? Math.ceil((peak + tolerance.hertz) / (frequency * (1 - share))) : Infinity
    const last = Math.min(end, tolerance.mostHarmonic ?? Infinity, first + (tolerance.mostPerSource ?? 1000))
    for (let harmonic = first; harmonic <= last; harmonic += 1) {
      const line = harmonic * frequency
      const deviation = peak - line
      if (Math.abs(deviation) <= line * share + tolerance.hertz) found.push({ source, harmonic, deviation })
    }
  }
  return found
}

/** How far a harmonic of a source may lie from its place, in Hz. */
export const reachOf = ({ source, harmonic }: CombCandidate, { ppm, hertz }: CombTolerance): number =>
  harmonic * source.frequency * (source.ppm ?? ppm) * 1e-6 + hertz

/** Two lines that a measurement could mistake for each other. */
export type CombClash = {
  readonly first: CombCandidate
  readonly second: CombCandidate
  /** Between the nominal frequencies of the two lines, in Hz. */
  readonly spacing: number
  /** The spacing that both tolerances together ask for, in Hz; for the same harmonic of two sources, twice the tolerance. */
  readonly needed: number
}

/**
 * The pairs among the candidates of one peak that this resolution cannot tell apart: lines of two sources nearer to each
 * other than both of their tolerances, which for the same harmonic h is h|f₁ − f₂| ≤ 2 × tolerance.
 */
export function clashesOf(
  candidates: readonly CombCandidate[],
  tolerance: CombTolerance,
): readonly CombClash[] {
  return candidates.flatMap((first, index) =>
    candidates
      .slice(index + 1)
      .filter(({ source }) => source !== first.source)
      .map((second) => {
        const spacing = Math.abs(
          first.harmonic * first.source.frequency - second.harmonic * second.source.frequency,
        )
        return { first, second, spacing, needed: reachOf(first, tolerance) + reachOf(second, tolerance) }
      })
      .filter(({ spacing, needed }) => spacing <= needed),
  )
}
