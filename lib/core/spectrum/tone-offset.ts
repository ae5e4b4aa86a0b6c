import { windowResponse } from './window-response'

/**
 * How far the tone whose highest bin is `bin` lies from its middle, in bins from −½ to ½: the place at which the closed
 * form of the window gives the same ratio of the bins on both flanks of the main lobe.
 *
 * Wide, flat windows are compared two bins away, where the main lobe is steep; without a window the bin itself is compared
 * with its higher neighbour, since both neighbours vanish for a tone in the middle.
 */
export function toneOffset(amplitudes: Float64Array, bin: number, coefficients: readonly number[]): number {
  const isPlain = coefficients.length === 1
  const away = windowResponse(coefficients, 1) > 0.75 ? 2 : 1
  const lower = amplitudes[bin - away] ?? 0
  const upper = amplitudes[bin + away] ?? 0
  const isUpwards = upper >= lower
  const reference = isPlain ? (amplitudes[bin] ?? 0) : Math.min(lower, upper)
  const measured = Math.max(lower, upper) / reference
  if (!Number.isFinite(measured)) return 0
  const expected = (offset: number) => {
    const near = Math.abs(windowResponse(coefficients, away - offset))
    return near / Math.abs(windowResponse(coefficients, isPlain ? offset : away + offset))
  }
  let low = 0
  let high = 0.5
  for (let halving = 0; halving < 40; halving += 1) {
    const middle = (low + high) / 2
    if (expected(middle) < measured) low = middle
    else high = middle
  }
  return isUpwards ? (low + high) / 2 : -(low + high) / 2
}
