import { blackmanHarris4 } from '../spectrum/cosine-window'
import { findTones } from '../spectrum/find-tones'
import { levelOfPeak } from '../spectrum/level'
import { amplitudeSpectrum, type AmplitudeSpectrum } from '../spectrum/record-spectrum'
import type { Tones } from './capture-analysis'
import { medianOf } from './median'

/** A sine stands above the noise from so many times its rms in a bin on; by chance one bin of 10⁹ does. */
const aboveNoise = 4.6

/** Sines so far below the strongest one, as a ratio, are not listed: 90 dB, where the side lobes of the window begin. */
const weakest = 10 ** (-90 / 20)

const mostTones = 200

/** Of a longer record so many samples from its start are enough to tell sines apart. */
const samplesEnough = 2 ** 20

/** Bins asked for the noise. */
const asked = 20_000

/**
 * The sines of a record: peaks of its amplitude spectrum under a four-term Blackman-Harris window (none where the record
 * holds whole periods) that stand above the noise, the strongest 200 of them, by rising frequency. Null where none does.
 */
export function tonesOf(values: Float64Array, intervalSeconds: number): Tones | null {
  const spectrum = amplitudeSpectrum(values.subarray(0, samplesEnough), intervalSeconds, blackmanHarris4)
  return spectrum.ok ? tonesIn(spectrum.value) : null
}

/** The sines of a spectrum that stand above its noise; null where none does. */
export function tonesIn(spectrum: AmplitudeSpectrum): Tones | null {
  const strongest = spectrum.amplitudes.subarray(1).reduce((most, value) => Math.max(most, value), 0)
  if (!(strongest > 0)) return null
  const floor = Math.max(aboveNoise * noiseOf(spectrum), weakest * strongest)
  const list = findTones(spectrum, { floor, mostTones })
  return list.length === 0 ? null : { list, floorLevel: levelOfPeak(floor) }
}

/** Rms of the noise in a bin, from the median of all, which sines hardly move. */
function noiseOf({ amplitudes }: AmplitudeSpectrum): number {
  const stride = Math.max(1, Math.floor(amplitudes.length / asked))
  const sizes: number[] = []
  for (let bin = 1; bin < amplitudes.length; bin += stride) sizes.push(amplitudes[bin] ?? 0)
  return sizes.length === 0 ? 0 : medianOf(sizes) / Math.sqrt(Math.LN2)
}

/** Sines of fewer periods than this in the record cannot be told from an edge. */
const fewestPeriods = 6

/** Sines with this part of the power of a record about its mean make it up. */
const mostOfPower = 0.9

/** More sines than this are no few. */
const fewSines = 40

/** So many samples from the middle of a record tell. */
const samplesTold = 2 ** 17

/** Whether a few steady sines of many periods make up a record, as they cannot make up single edges. */
export function isSumOfSines(values: Float64Array, intervalSeconds: number): boolean {
  const count = Math.min(values.length, samplesTold)
  const first = (values.length - count) >> 1
  const tones = tonesOf(values.subarray(first, first + count), intervalSeconds)
  if (tones === null || tones.list.length > fewSines) return false
  const least = fewestPeriods / (count * intervalSeconds)
  const power = tones.list.reduce(
    (sum, { frequency, amplitude }) => (frequency < least ? sum : sum + amplitude ** 2 / 2),
    0,
  )
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length
  const all = values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / values.length
  return power >= mostOfPower * all
}
