import { medianOf } from './median'

/** So many neighbours tell the noise. */
const asked = 20_000

/** The median of the size of a normal deviate. */
const medianDeviate = 0.6745

/**
 * The standard deviation of the noise from sample to sample: the median size of second differences over 0.6745 √6, which
 * neither edges nor slopes disturb, and at least the rounding of the converter, step/√12.
 */
export function sampleNoise(values: Float64Array, converterStep: number): number {
  const stride = Math.max(1, Math.floor((values.length - 2) / asked))
  const sizes: number[] = []
  for (let index = 1; index < values.length - 1; index += stride) {
    const bend = (values[index - 1] ?? 0) - 2 * (values[index] ?? 0) + (values[index + 1] ?? 0)
    sizes.push(Math.abs(bend))
  }
  const deviation = sizes.length === 0 ? 0 : medianOf(sizes) / (medianDeviate * Math.sqrt(6))
  return Math.max(deviation, converterStep / Math.sqrt(12))
}
