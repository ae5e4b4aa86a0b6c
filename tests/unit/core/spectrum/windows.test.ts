import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { cosineWindows, underWindow } from '@/lib/core/spectrum/cosine-window'
import { dftAmplitudes } from '@/lib/core/spectrum/dft-amplitude'
import { windowFigures, windowResponse } from '@/lib/core/spectrum/window-response'

// Coherent gain, ENBW, scallop, 3 dB and 6 dB widths. Source: F. J. Harris, Proc. IEEE 66(1), 1978 (from memory); Hann's
// ENBW and scallop and the three-term windows also in a public oscilloscope manual. 3 and 6 dB taken exactly.
const published = [
  ['rectangular', 1, 1.0, 3.9224, 0.8845, 1.205],
  ['hann', 0.5, 1.5, 1.4236, 1.4382, 1.9968],
  ['hamming', 0.54, 1.3628, 1.7514, 1.3008, 1.8123],
  ['blackman', 0.42, 1.7268, 1.0989, 1.6409, 2.295],
  ['blackman-harris-4', 0.35875, 2.0044, 0.8256, 1.8962, 2.662],
  ['blackman-harris-3', 0.42323, 1.7085, 1.1287, 1.6208, 2.2702],
  ['flat-top-5', 0.21557895, 3.7702, 0.0098, 3.721, 4.5781],
  ['flat-top-3', 0.2810639, 2.9656, 0, 2.9356, 3.5586],
] as const

describe('the figures of a window', () => {
  it.each(published)('%s', (id, gain, noise, scallop, width3, width6) => {
    const window = cosineWindows.find((each) => each.id === id)
    const figures = windowFigures(window?.coefficients ?? [])
    expect(figures?.coherentGain).toBe(gain)
    expect(figures?.noiseBandwidth).toBeCloseTo(noise, 4)
    expect(figures?.scallopLoss).toBeCloseTo(scallop, 4)
    expect(figures?.width3dB).toBeCloseTo(width3, 4)
    expect(figures?.width6dB).toBeCloseTo(width6, 4)
  })

  it('follow from the very values of the window', () => {
    for (const { coefficients } of cosineWindows) {
      const values = underWindow(new Float64Array(4096).fill(1), coefficients)
      const sum = values.reduce((total, value) => total + value, 0)
      const squares = values.reduce((total, value) => total + value * value, 0)
      const figures = windowFigures(coefficients)
      expect(figures?.coherentGain).toBeCloseTo(sum / 4096, 12)
      expect(figures?.noiseBandwidth).toBeCloseTo((4096 * squares) / sum ** 2, 10)
    }
  })

  it('do not exist without a main lobe around 0', () => {
    expect(windowFigures([])).toBeNull()
    expect(windowFigures([0, 1])).toBeNull()
    expect(windowFigures([-1])).toBeNull()
    expect(windowFigures([Number.NaN])).toBeNull()
  })
})

describe('the amplitude in a bin', () => {
  it('is the peak value of a tone on the bin, whatever the window', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...cosineWindows),
        fc.integer({ min: 12, max: 180 }),
        fc.double({ min: 1e-6, max: 1e3, noNaN: true }),
        ({ coefficients }, bin, peak) => {
          const count = 400
          const values = Float64Array.from(
            { length: count },
            (_, n) => peak * Math.cos((2 * Math.PI * bin * n) / count + 0.4),
          )
          const amplitude = dftAmplitudes(values, coefficients)[bin] ?? 0
          return Math.abs(amplitude / peak - 1) < 1e-12
        },
      ),
    )
  })

  it('falls between bins as the closed form says', () => {
    for (const { coefficients } of cosineWindows) {
      const values = Float64Array.from({ length: 4096 }, (_, n) =>
        Math.cos((2 * Math.PI * 1000.3 * n) / 4096),
      )
      const amplitudes = dftAmplitudes(values, coefficients)
      expect(amplitudes[1000]).toBeCloseTo(Math.abs(windowResponse(coefficients, 0.3)), 3)
      expect(amplitudes[1001]).toBeCloseTo(Math.abs(windowResponse(coefficients, 0.7)), 3)
    }
  })

  it('counts the constant and the highest frequency once', () => {
    const alternating = Float64Array.from({ length: 8 }, (_, n) => 3 + (n % 2 === 0 ? 2 : -2))
    const amplitudes = dftAmplitudes(alternating, [1])
    expect(amplitudes[0]).toBeCloseTo(3, 12)
    expect(amplitudes[4]).toBeCloseTo(2, 12)
  })
})
