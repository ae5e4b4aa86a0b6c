/**
 * A window as its cosine coefficients: w[n] = Σ (−1)^k a_k cos(2π k n/N), the periodic form. Kept by coefficients because
 * names are ambiguous: “flat top” and “Blackman-Harris” mean three-term windows on some instruments and longer ones on
 * others.
 */
export type CosineWindow = {
  readonly id: string
  readonly name: string
  readonly coefficients: readonly number[]
}

const windowOf = (id: string, name: string, ...coefficients: readonly number[]): CosineWindow => ({
  id,
  name,
  coefficients,
})

export const rectangular = windowOf('rectangular', 'Rectangular', 1)
export const hann = windowOf('hann', 'Hann, two terms', 0.5, 0.5)
export const hamming = windowOf('hamming', 'Hamming, two terms', 0.54, 0.46)
export const blackman = windowOf('blackman', 'Blackman, three terms', 0.42, 0.5, 0.08)
export const blackmanHarris3 = windowOf(
  'blackman-harris-3',
  'Blackman-Harris, three terms, 67 dB',
  0.42323,
  0.49755,
  0.07922,
)
export const blackmanHarris4 = windowOf(
  'blackman-harris-4',
  'Blackman-Harris, four terms, 92 dB',
  0.35875,
  0.48829,
  0.14128,
  0.01168,
)
export const flatTop3 = windowOf('flat-top-3', 'Flat top, three terms', 0.2810639, 0.5208972, 0.1980399)
export const flatTop5 = windowOf(
  'flat-top-5',
  'Flat top, five terms',
  0.21557895,
  0.41663158,
  0.277263158,
  0.083578947,
  0.006947368,
)

/**
 * The windows that are offered.
 *
 * Source: F. J. Harris, “On the use of windows for harmonic analysis with the DFT”, Proc. IEEE 66(1), 1978, 51-83 (from
 * memory); the five-term flat top is the one of common numerical libraries.
 */
export const cosineWindows: readonly CosineWindow[] = [
  rectangular,
  hann,
  hamming,
  blackman,
  blackmanHarris3,
  blackmanHarris4,
  flatTop3,
  flatTop5,
]

/** The values of a record under a window, w[n]·x[n], as a new array. */
export function underWindow(values: Float64Array, coefficients: readonly number[]): Float64Array {
  const out = new Float64Array(values.length)
  const signed = coefficients.map((coefficient, k) => (k % 2 === 0 ? coefficient : -coefficient))
  const step = (2 * Math.PI) / values.length
  for (let n = 0; n < out.length; n += 1) {
    out[n] = (values[n] ?? 0) * cosineSum(signed, Math.cos(step * n))
  }
  return out
}

/** Σ a_k cos(kθ) from cos θ, by Clenshaw's recurrence. */
function cosineSum(coefficients: readonly number[], cosine: number): number {
  let next = 0
  let afterNext = 0
  for (let k = coefficients.length - 1; k > 0; k -= 1) {
    const current = (coefficients[k] ?? 0) + 2 * cosine * next - afterNext
    afterNext = next
    next = current
  }
  return (coefficients[0] ?? 0) + cosine * next - afterNext
}
