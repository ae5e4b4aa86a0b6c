import { forwardTransformOf, inverseComplex, transformComplex } from './complex-transform'
import { lastUsed } from './plan-cache'
import { rootsOfUnity } from './twiddles'

const rootsOf = lastUsed(4, (length) => rootsOfUnity(Math.floor(length / 4) + 1, length))

/**
 * Discrete Fourier transform X[k] = Σ x[n] exp(−j 2π kn/N) of real values of any number N, for k = 0 … ⌊N/2⌋; the other
 * half is its mirror. Returned interleaved (real, imaginary, real, …), 2(⌊N/2⌋ + 1) numbers; no values give none.
 *
 * An even number is packed into half as many complex values. Double precision, as `transformComplex`.
 */
export function transformReal(values: Float64Array): Float64Array {
  const { length } = values
  if (length === 0) return new Float64Array(0)
  if (length % 2 === 1) return transformOdd(values)
  const spectrum = new Float64Array(length + 2)
  forwardTransformOf(length / 2)(values, spectrum)
  untangle(spectrum, length)
  return spectrum
}

/** The real values whose `transformReal` is `spectrum`; `length` tells an even number from the odd one above it. */
export function inverseReal(spectrum: Float64Array, length: number): Float64Array {
  const full = new Float64Array(2 * length)
  full.set(spectrum.subarray(0, 2 * (Math.floor(length / 2) + 1)))
  for (let k = Math.floor(length / 2) + 1; k < length; k += 1) {
    full[2 * k] = spectrum[2 * (length - k)] ?? 0
    full[2 * k + 1] = -(spectrum[2 * (length - k) + 1] ?? 0)
  }
  return inverseComplex(full).filter((_, index) => index % 2 === 0)
}

function transformOdd(values: Float64Array): Float64Array {
  const complex = new Float64Array(2 * values.length)
  values.forEach((value, index) => (complex[2 * index] = value))
  return transformComplex(complex).slice(0, values.length + 1)
}

/** Takes the transforms of the even and the odd values apart and joins them to the transform of all, in place. */
function untangle(spectrum: Float64Array, length: number): void {
  const half = length / 2
  const roots = rootsOf(length)
  const first = spectrum[0] ?? 0
  const second = spectrum[1] ?? 0
  spectrum[0] = first + second
  spectrum[1] = 0
  spectrum[length] = first - second
  spectrum[length + 1] = 0
  for (let k = 1; k <= half / 2; k += 1) {
    const low = 2 * k
    const high = 2 * (half - k)
    const lowR = spectrum[low] ?? 0
    const lowI = spectrum[low + 1] ?? 0
    const highR = spectrum[high] ?? 0
    const highI = spectrum[high + 1] ?? 0
    const wr = roots[low] ?? 0
    const wi = roots[low + 1] ?? 0
    const evenR = 0.5 * (lowR + highR)
    const evenI = 0.5 * (lowI - highI)
    const oddR = 0.5 * (lowI + highI)
    const oddI = 0.5 * (highR - lowR)
    const turnedR = wr * oddR - wi * oddI
    const turnedI = wr * oddI + wi * oddR
    spectrum[low] = evenR + turnedR
    spectrum[low + 1] = evenI + turnedI
    spectrum[high] = evenR - turnedR
    spectrum[high + 1] = turnedI - evenI
  }
}
