import { transformReal } from '../fourier/real-transform'
import { underWindow } from './cosine-window'

/**
 * The single-sided peak amplitude in every bin from 0 to N/2 of a windowed record: 2|X[k]|/Σw, and |X[k]|/Σw for 0 Hz and
 * for N/2, which have no mirror. A tone in the middle of a bin reads its peak value whatever the window.
 */
export function dftAmplitudes(values: Float64Array, coefficients: readonly number[]): Float64Array {
  const count = values.length
  const isPlain = coefficients.length === 1
  const spectrum = transformReal(isPlain ? values : underWindow(values, coefficients))
  const gain = isPlain ? 1 : (coefficients[0] ?? 1)
  const amplitudes = new Float64Array(spectrum.length / 2)
  for (let k = 0; k < amplitudes.length; k += 1) {
    const isAlone = k === 0 || 2 * k === count
    const size = Math.hypot(spectrum[2 * k] ?? 0, spectrum[2 * k + 1] ?? 0)
    amplitudes[k] = ((isAlone ? 1 : 2) * size) / (count * gain)
  }
  return amplitudes
}
