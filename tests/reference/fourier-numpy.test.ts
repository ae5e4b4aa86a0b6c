import { execFileSync } from 'node:child_process'
import { fileURLToPath } from 'node:url'

import { describe, expect, it } from 'vitest'

import { pythonWithScipy } from '@/lib/commands/python'
import { transformReal } from '@/lib/core/fourier/real-transform'

const python = pythonWithScipy()

const script = fileURLToPath(new URL('./fourier-spectra.py', import.meta.url))

/** Every way through the transform: short, odd, with factors 3 and 5, prime, blocked, blocked by chirp. */
const lengths = [
  1,
  2,
  3,
  7,
  16,
  60,
  97,
  1000,
  1024,
  2187,
  3125,
  4093,
  9000,
  65_536,
  100_003,
  250_000,
  2 ** 20,
]

// Source: numpy.fft.rfft (pocketfft), a general-purpose library, run in the same test.
describe.skipIf(python === null)(
  'the real transform beside numpy.fft.rfft (skipped without numpy and scipy)',
  () => {
    const bytes = python
      ? execFileSync(python, [script, ...lengths.map(String)], { maxBuffer: 2 ** 28 })
      : Buffer.alloc(0)
    const numbers = new Float64Array(
      bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength),
    )

    it.each(lengths)('%i values: within 2·10⁻¹⁵ of its rms', (length) => {
      const before = lengths
        .slice(0, lengths.indexOf(length))
        .reduce((sum, n) => sum + n + 2 * (Math.floor(n / 2) + 1), 0)
      const values = numbers.slice(before, before + length)
      const expected = numbers.subarray(before + length, before + length + 2 * (Math.floor(length / 2) + 1))
      const got = transformReal(values)
      let difference = 0
      let size = 0
      got.forEach((value, index) => {
        difference += (value - (expected[index] ?? NaN)) ** 2
        size += (expected[index] ?? NaN) ** 2
      })
      expect(Math.sqrt(difference / size)).toBeLessThanOrEqual(2e-15)
    })
  },
)
