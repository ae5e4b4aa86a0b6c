import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { NumberScanner } from '@/lib/core/waveform/number-scanner'

const bytesOf = (text: string) => new TextEncoder().encode(text)
const read = (text: string, mark?: number) => new NumberScanner(bytesOf(text), mark).read(0)

const digits = fc.string({ unit: fc.constantFrom(...'0123456789'), minLength: 1, maxLength: 25 })
const decimal = fc
  .record({
    sign: fc.constantFrom('', '-', '+'),
    whole: digits,
    fraction: fc.option(digits),
    exponent: fc.option(fc.integer({ min: -340, max: 300 })),
    letter: fc.constantFrom('e', 'E', 'e+'),
  })
  .map(({ sign, whole, fraction, exponent, letter }) => {
    const power = exponent === null ? '' : `${exponent < 0 ? letter[0] : letter}${exponent}`
    return `${sign}${whole}${fraction === null ? '' : `.${fraction}`}${power}`
  })

describe('NumberScanner', () => {
  it('gives the same bits as Number for any decimal text', () => {
    fc.assert(
      fc.property(decimal, (text) => {
        expect(read(text)).toBe(Number(text))
      }),
      { numRuns: 5000 },
    )
  })

  it('gives back every double that is written as JavaScript or an instrument writes it', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(read(String(value))).toBe(Number(String(value)))
        expect(read(value.toExponential(9))).toBe(Number(value.toExponential(9)))
      }),
      { numRuns: 5000 },
    )
  })

  it('stops where the number ends', () => {
    const scanner = new NumberScanner(bytesOf('-1.5e-3,7'))
    expect(scanner.read(0)).toBe(-0.0015)
    expect(scanner.end).toBe(7)
    expect(scanner.read(8)).toBe(7)
  })

  it.each(['', '-', '.', 'e5', '1e', '1e+', 'NaN', 'Infinity', '--1', 'x'])(
    'takes “%s” for no number',
    (text) => {
      expect(read(text)).toBeNaN()
    },
  )

  it('tells a number that is too large', () => {
    expect(read('1e400')).toBe(Infinity)
    expect(read('-1e400')).toBe(-Infinity)
    expect(read(`1e${'9'.repeat(400)}`)).toBe(Infinity)
  })

  it('takes the first decimal mark for all numbers where either may come', () => {
    const scanner = new NumberScanner(bytesOf('1,5;2.5'), 0)
    expect(scanner.read(0)).toBe(1.5)
    expect(scanner.read(4)).toBe(2)
    expect(scanner.end).toBe(5)
  })
})
