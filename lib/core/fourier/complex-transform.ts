import { planBlocked, runBlocked } from './blocked'
import { planBluestein, type ForwardTransform } from './bluestein'
import { lastUsed } from './plan-cache'
import { planStockham, runStockham } from './stockham'

/** Up to this length both working arrays of a transform stay in the first caches. */
const longestDirect = 4096

const plansKept = 4

/** The forward transform of one length; its tables are kept for the lengths used last. */
export const forwardTransformOf: (length: number) => ForwardTransform = lastUsed(plansKept, makeTransform)

function makeTransform(length: number): ForwardTransform {
  const blocked = length > longestDirect ? planBlocked(length) : null
  if (blocked !== null) return (values, out) => runBlocked(blocked, values, out)
  const direct = planStockham(length)
  if (direct === null) return planBluestein(length, makeTransform)
  const x = new Float64Array(2 * length)
  const y = new Float64Array(2 * length)
  return (values, out) => {
    x.set(values.subarray(0, 2 * length))
    out.set(runStockham(direct, x, y, 1))
  }
}

/**
 * Discrete Fourier transform X[k] = Σ x[n] exp(−j 2π kn/N) of complex values of any number N.
 *
 * `values` is interleaved (real, imaginary, real, …), as is the new array that is returned; no values give none.
 * Double precision: the relative rms error is below 2·10⁻¹⁵ up to millions of values.
 */
export function transformComplex(values: Float64Array): Float64Array {
  const length = values.length / 2
  const out = new Float64Array(values.length)
  if (length > 0) forwardTransformOf(length)(values, out)
  return out
}

/** The inverse x[n] = (1/N) Σ X[k] exp(+j 2π kn/N) of `transformComplex`, interleaved like it. */
export function inverseComplex(spectrum: Float64Array): Float64Array {
  const length = spectrum.length / 2
  const values = transformComplex(swapped(spectrum))
  return swapped(values).map((value) => value / length)
}

/** Real and imaginary parts exchanged: turns a forward transform into an inverse one. */
function swapped(values: Float64Array): Float64Array {
  const out = new Float64Array(values.length)
  for (let index = 0; index < values.length; index += 2) {
    out[index] = values[index + 1] ?? 0
    out[index + 1] = values[index] ?? 0
  }
  return out
}
