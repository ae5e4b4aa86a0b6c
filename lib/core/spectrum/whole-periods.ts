/** Peaks so far below the strongest one, as a ratio, are not asked: 40 dB. */
const weakest = 0.01

/** A bin beside a peak may hold so much of it: 34 dB below. */
const mostBeside = 0.02

/** How many of the strongest peaks are asked. */
const mostAsked = 64

/**
 * Whether the strong tones of an unwindowed spectrum all fall on bins: nothing beside the peaks within 40 dB of the
 * strongest. A tone d bins off the middle of its bin leaves about d of itself in the next one, so d ≤ 0.02, and the
 * amplitude is then right within 0.01 dB.
 */
export function spansWholePeriods(amplitudes: Float64Array): boolean {
  const strongest = amplitudes.reduce((most, value) => Math.max(most, value), 0)
  if (!(strongest > 0)) return false
  const peaks = localPeaks(amplitudes, weakest * strongest)
  if (peaks.length === 0) return false
  const at = (index: number) => amplitudes[index] ?? 0
  return peaks.slice(0, mostAsked).every((k) => Math.max(at(k - 1), at(k + 1)) <= mostBeside * at(k))
}

function localPeaks(amplitudes: Float64Array, floor: number): readonly number[] {
  const peaks: number[] = []
  for (let k = 2; k < amplitudes.length - 1; k += 1) {
    const value = amplitudes[k] ?? 0
    if (value < floor || value < (amplitudes[k - 1] ?? 0) || value < (amplitudes[k + 1] ?? 0)) continue
    peaks.push(k)
  }
  return peaks.sort((a, b) => (amplitudes[b] ?? 0) - (amplitudes[a] ?? 0))
}
