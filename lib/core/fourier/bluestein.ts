import { nextSmoothLength } from './radices'
import { rootsOfUnity } from './twiddles'

/** Forward transform of interleaved complex values, written to `out`. */
export type ForwardTransform = (values: Float64Array, out: Float64Array) => void

/**
 * A transform of any length as a convolution with a chirp, by three transforms of a longer, easy length:
 *
 *     nk = (n² + k² − (k − n)²)/2
 *
 * `planOf` gives the transform of an easy length. Source: L. I. Bluestein, "A linear filtering approach to the computation
 * of the discrete Fourier transform", IEEE Trans. Audio Electroacoust. 18, 1970, 451-455 (from memory).
 */
export function planBluestein(
  length: number,
  planOf: (length: number) => ForwardTransform,
): ForwardTransform {
  const padded = nextSmoothLength(2 * length - 1)
  const transform = planOf(padded)
  const chirp = chirpOf(length)
  const product = new Float64Array(2 * padded)
  const spectrum = new Float64Array(2 * padded)
  const kernel = new Float64Array(2 * padded)
  transform(conjugateMirrored(chirp, length, padded), kernel)
  return (values, out) => {
    product.fill(0)
    multiply(values, chirp, product, length)
    transform(product, spectrum)
    multiply(spectrum, kernel, product, padded)
    // The inverse is the forward transform between two conjugations.
    conjugate(product)
    transform(product, spectrum)
    conjugate(spectrum)
    multiply(spectrum, chirp, out, length)
    for (let index = 0; index < 2 * length; index += 1) out[index] = (out[index] ?? 0) / padded
  }
}

/** exp(−j π n²/N); n² is taken modulo 2N, so that no digit is lost to a long angle. */
function chirpOf(length: number): Float64Array {
  const roots = rootsOfUnity(2 * length, 2 * length)
  const chirp = new Float64Array(2 * length)
  let square = 0
  for (let n = 0; n < length; n += 1) {
    chirp[2 * n] = roots[2 * square] ?? 0
    chirp[2 * n + 1] = roots[2 * square + 1] ?? 0
    square = (square + 2 * n + 1) % (2 * length)
  }
  return chirp
}

function conjugateMirrored(chirp: Float64Array, length: number, padded: number): Float64Array {
  const values = new Float64Array(2 * padded)
  for (let n = 0; n < length; n += 1) {
    for (const place of n === 0 ? [0] : [n, padded - n]) {
      values[2 * place] = chirp[2 * n] ?? 0
      values[2 * place + 1] = -(chirp[2 * n + 1] ?? 0)
    }
  }
  return values
}

function multiply(a: Float64Array, b: Float64Array, out: Float64Array, count: number): void {
  for (let index = 0; index < 2 * count; index += 2) {
    const ar = a[index] ?? 0
    const ai = a[index + 1] ?? 0
    const br = b[index] ?? 0
    const bi = b[index + 1] ?? 0
    out[index] = ar * br - ai * bi
    out[index + 1] = ar * bi + ai * br
  }
}

function conjugate(values: Float64Array): void {
  for (let index = 1; index < values.length; index += 2) values[index] = -(values[index] ?? 0)
}
