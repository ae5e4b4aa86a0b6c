import { levelOfPeak } from './level'
import type { AmplitudeSpectrum } from './record-spectrum'
import { toneOffset } from './tone-offset'
import { windowResponse } from './window-response'

/** A sine in a record. */
export type Tone = {
  /** In Hz. */
  readonly frequency: number
  /** Peak value, in the unit of the record. */
  readonly amplitude: number
  /** In dBµV rms where the record is in volts. */
  readonly level: number
}

export type ToneSearch = {
  /** Peak value below which nothing is a tone. */
  readonly floor: number
  readonly mostTones?: number
}

/** A bin must be so many times what leaks into it from stronger tones. */
const aboveLeakage = 2

type Found = Tone & { readonly position: number }

/**
 * The tones above a floor, by rising frequency: local peaks that are no side lobes of stronger tones, with their place
 * between bins and their amplitude from the closed form of the window. Frequency within a twentieth of a bin, level within
 * 0.1 dB, for tones at least a main lobe apart and 20 dB above the noise in a bin.
 */
export function findTones(spectrum: AmplitudeSpectrum, search: ToneSearch): readonly Tone[] {
  const { amplitudes, window } = spectrum
  const found: Found[] = []
  for (const bin of peakBins(spectrum, search.floor)) {
    if (found.length >= (search.mostTones ?? 200)) break
    const leaked = found.reduce(
      (sum, tone) =>
        sum + tone.amplitude * Math.abs(windowResponse(window.coefficients, bin - tone.position)),
      0,
    )
    if ((amplitudes[bin] ?? 0) > aboveLeakage * leaked) found.push(toneInBin(spectrum, bin))
  }
  return found
    .sort((a, b) => a.frequency - b.frequency)
    .map(({ frequency, amplitude, level }) => ({ frequency, amplitude, level }))
}

/**
 * The tone nearest to an expected frequency, such as a harmonic: the highest bin within `within` Hz of it and at least one
 * bin on either side. Null outside the spectrum or where nothing is there.
 */
export function toneNear(spectrum: AmplitudeSpectrum, expected: number, within: number): Tone | null {
  const { amplitudes, binWidth } = spectrum
  const middle = Math.round(expected / binWidth)
  const reach = Math.max(1, Math.ceil(within / binWidth))
  const first = Math.max(1, middle - reach)
  const last = Math.min(amplitudes.length - 2, middle + reach)
  let best = first
  for (let bin = first; bin <= last; bin += 1) {
    if ((amplitudes[bin] ?? 0) > (amplitudes[best] ?? 0)) best = bin
  }
  if (last < first || !((amplitudes[best] ?? 0) > 0)) return null
  const { frequency, amplitude, level } = toneInBin(spectrum, best)
  return { frequency, amplitude, level }
}

function toneInBin({ amplitudes, binWidth, window }: AmplitudeSpectrum, bin: number): Found {
  const offset = toneOffset(amplitudes, bin, window.coefficients)
  const amplitude = (amplitudes[bin] ?? 0) / windowResponse(window.coefficients, offset)
  const position = bin + offset
  return { position, frequency: position * binWidth, amplitude, level: levelOfPeak(amplitude) }
}

/** Bins that are no lower than all within half a main lobe, the strongest first. */
function peakBins({ amplitudes, window }: AmplitudeSpectrum, floor: number): readonly number[] {
  const reach = window.coefficients.length
  const bins: number[] = []
  for (let bin = 1; bin < amplitudes.length - 1; bin += 1) {
    const value = amplitudes[bin] ?? 0
    if (value > 0 && value >= floor && isHighest(amplitudes, bin, reach)) bins.push(bin)
  }
  return bins.sort((a, b) => (amplitudes[b] ?? 0) - (amplitudes[a] ?? 0))
}

function isHighest(amplitudes: Float64Array, bin: number, reach: number): boolean {
  const value = amplitudes[bin] ?? 0
  for (let away = 1; away <= reach; away += 1) {
    if ((amplitudes[bin - away] ?? 0) >= value || (amplitudes[bin + away] ?? 0) > value) return false
  }
  return true
}
