import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { inverseComplex, transformComplex } from '@/lib/core/fourier/complex-transform'
import { inverseReal, transformReal } from '@/lib/core/fourier/real-transform'
import { longestSmoothLength, nextSmoothLength, radicesOf } from '@/lib/core/fourier/radices'
import { rootOfUnity } from '@/lib/core/fourier/twiddles'

/** Repeatable values between −1 and 1 that no length divides. */
const noise = (count: number, seed: number): Float64Array =>
  Float64Array.from({ length: count }, (_, index) => {
    const x = Math.sin((index + 1) * 12.9898 + seed * 78.233) * 43758.5453
    return 2 * (x - Math.floor(x)) - 1
  })

const energy = (values: Float64Array): number => values.reduce((sum, value) => sum + value * value, 0)

function relativeDifference(got: Float64Array, expected: Float64Array): number {
  const difference = got.map((value, index) => value - (expected[index] ?? NaN))
  return Math.sqrt(energy(difference) / Math.max(energy(expected), 1e-300))
}

/** The sum of the definition, term by term. */
function definition(values: Float64Array): Float64Array {
  const count = values.length / 2
  const out = new Float64Array(values.length)
  for (let k = 0; k < count; k += 1) {
    for (let n = 0; n < count; n += 1) {
      const [c, s] = rootOfUnity((k * n) % count, count)
      const re = values[2 * n] ?? 0
      const im = values[2 * n + 1] ?? 0
      out[2 * k] = (out[2 * k] ?? 0) + c * re - s * im
      out[2 * k + 1] = (out[2 * k + 1] ?? 0) + c * im + s * re
    }
  }
  return out
}

const anyLength = fc.integer({ min: 1, max: 3000 })

const anySeed = fc.integer({ min: 0, max: 1000 })

describe('the Fourier transform', () => {
  it('is the sum of its definition, for every length up to 130', () => {
    for (let length = 1; length <= 130; length += 1) {
      const values = noise(2 * length, length)
      expect(relativeDifference(transformComplex(values), definition(values)), `${length}`).toBeLessThan(
        2e-15,
      )
    }
  })

  it('comes back by its inverse, for any length', () => {
    fc.assert(
      fc.property(anyLength, anySeed, (length, seed) => {
        const values = noise(2 * length, seed)
        return relativeDifference(inverseComplex(transformComplex(values)), values) < 2e-15
      }),
      { numRuns: 200 },
    )
  })

  it('keeps the energy (Parseval), for any length', () => {
    fc.assert(
      fc.property(anyLength, anySeed, (length, seed) => {
        const values = noise(2 * length, seed)
        return Math.abs(energy(transformComplex(values)) / length / energy(values) - 1) < 1e-13
      }),
      { numRuns: 100 },
    )
  })

  it('is linear', () => {
    fc.assert(
      fc.property(anyLength, anySeed, (length, seed) => {
        const a = noise(2 * length, seed)
        const b = noise(2 * length, seed + 1)
        const together = transformComplex(a.map((value, index) => 2 * value - 3 * (b[index] ?? 0)))
        const [fa, fb] = [transformComplex(a), transformComplex(b)]
        return (
          relativeDifference(
            together,
            fa.map((value, index) => 2 * value - 3 * (fb[index] ?? 0)),
          ) < 5e-15
        )
      }),
      { numRuns: 100 },
    )
  })

  it('turns a shift of the values into a turn of every frequency', () => {
    fc.assert(
      fc.property(anyLength, anySeed, (length, seed) => {
        const values = noise(2 * length, seed)
        const by = seed % length
        const shifted = values.map((_, index) => values[(index + 2 * by) % values.length] ?? 0)
        const plain = transformComplex(values)
        const turned = new Float64Array(plain.length)
        for (let k = 0; k < length; k += 1) {
          const [c, s] = rootOfUnity((k * by) % length, length)
          turned[2 * k] = c * (plain[2 * k] ?? 0) + s * (plain[2 * k + 1] ?? 0)
          turned[2 * k + 1] = c * (plain[2 * k + 1] ?? 0) - s * (plain[2 * k] ?? 0)
        }
        return relativeDifference(transformComplex(shifted), turned) < 5e-15
      }),
      { numRuns: 100 },
    )
  })

  it('of real values is the first half of the complex one, and comes back', () => {
    fc.assert(
      fc.property(anyLength, anySeed, (length, seed) => {
        const values = noise(length, seed)
        const complex = new Float64Array(2 * length)
        values.forEach((value, index) => (complex[2 * index] = value))
        const spectrum = transformReal(values)
        const half = transformComplex(complex).subarray(0, 2 * (Math.floor(length / 2) + 1))
        return (
          relativeDifference(spectrum, half) < 3e-15 &&
          relativeDifference(inverseReal(spectrum, length), values) < 3e-15
        )
      }),
      { numRuns: 200 },
    )
  })

  it.each([4098, 6000, 8192, 10_000, 15_625, 65_536, 99_991, 118_098, 131_072])(
    'of %i values, long enough to be blocked or to need a chirp, comes back',
    (length) => {
      const values = noise(2 * length, 1)
      expect(relativeDifference(inverseComplex(transformComplex(values)), values)).toBeLessThan(2e-15)
    },
  )

  it('answers no values with none, and one with itself', () => {
    expect(transformReal(new Float64Array(0))).toHaveLength(0)
    expect(Array.from(transformReal(Float64Array.of(3)))).toEqual([3, 0])
    expect(Array.from(transformReal(Float64Array.of(3, 1)))).toEqual([4, 0, 2, 0])
  })
})

describe('the lengths of transforms', () => {
  it('are taken apart into fours, twos, threes and fives', () => {
    expect(radicesOf(2400)).toEqual([4, 4, 2, 3, 5, 5])
    expect(radicesOf(1)).toEqual([])
    expect(radicesOf(14)).toBeNull()
  })

  it('are rounded up and down to lengths with small factors only', () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 10_000_000 }), (n) => {
        const up = nextSmoothLength(n)
        const down = longestSmoothLength(n)
        expect(radicesOf(up)).not.toBeNull()
        expect(radicesOf(down)).not.toBeNull()
        expect(up).toBeGreaterThanOrEqual(n)
        expect(up).toBeLessThan(1.34 * n + 1)
        expect(down % 2).toBe(0)
        expect(down).toBeLessThanOrEqual(n)
        expect(down).toBeGreaterThan(0.6 * n)
      }),
    )
  })
})
