import { sinc } from './pulse-train'

/**
 * The transform of a long cosine-sum window, `bins` away from its middle, over the transform in the middle:
 *
 *     W(x)/W(0) = Σ a_k/2 [sinc(x − k) + sinc(x + k)] / a_0
 *
 * Exact as the number of values grows; the error is of the order of 1/N².
 */
export function windowResponse(coefficients: readonly number[], bins: number): number {
  const sum = coefficients.reduce((total, a, k) => total + (a / 2) * (sinc(bins - k) + sinc(bins + k)), 0)
  return sum / (coefficients[0] ?? 1)
}

/** What a cosine-sum window does to a spectrum; widths in bins, one bin being the sample rate over N. */
export type WindowFigures = {
  /** Mean of the window, by which the amplitude of a tone is too small. */
  readonly coherentGain: number
  /** Equivalent noise bandwidth. */
  readonly noiseBandwidth: number
  /** How much a tone midway between two bins reads too low, in dB. */
  readonly scallopLoss: number
  readonly width3dB: number
  readonly width6dB: number
}

/**
 * Coherent gain a_0, equivalent noise bandwidth (a_0² + ½ Σ a_k²)/a_0², scallop loss −20 lg W(½)/W(0), and the widths of
 * the main lobe 3 dB and 6 dB below its middle, searched on the closed form.
 *
 * Null where the coefficients give no window with one main lobe around 0. Source: Harris 1978 (from memory).
 */
export function windowFigures(coefficients: readonly number[]): WindowFigures | null {
  const [mean, ...others] = coefficients
  if (mean === undefined || !(mean > 0) || !coefficients.every(Number.isFinite)) return null
  const between = windowResponse(coefficients, 0.5)
  const width3dB = widthAt(coefficients, 10 ** (-3 / 20))
  const width6dB = widthAt(coefficients, 10 ** (-6 / 20))
  if (!(between > 0) || width3dB === null || width6dB === null) return null
  return {
    coherentGain: mean,
    noiseBandwidth: 1 + others.reduce((sum, a) => sum + (a / mean) ** 2 / 2, 0),
    scallopLoss: -20 * Math.log10(between),
    width3dB,
    width6dB,
  }
}

/** The full width of the main lobe where it first falls to `share` of its middle. */
function widthAt(coefficients: readonly number[], share: number): number | null {
  const step = 1 / 64
  const most = coefficients.length + 1
  let low = 0
  while (low < most && windowResponse(coefficients, low + step) > share) low += step
  if (low >= most) return null
  let high = low + step
  for (let halving = 0; halving < 60; halving += 1) {
    const middle = (low + high) / 2
    if (windowResponse(coefficients, middle) > share) low = middle
    else high = middle
  }
  return low + high
}
