import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { formatQuantity, quantityText } from '@/lib/core/units/format-quantity'
import { parseQuantity } from '@/lib/core/units/parse-quantity'
import { units } from '@/lib/core/units/unit'

describe('a value in engineering notation', () => {
  it.each([
    [4.7e-9, 'F', 3, '4.70', 'nF'],
    [102.72e6, 'Hz', 4, '102.7', 'MHz'],
    [0.000999999, 's', 3, '1.00', 'ms'],
    [999.96e-12, 'F', 4, '1.000', 'nF'],
    [-0.25, 'V', 2, '−250', 'mV'],
    [0, 'A', 4, '0', 'A'],
    [-0, 'A', 4, '0', 'A'],
    [1e-6, 's', 2, '1.0', '\u00b5s'],
    [0.4949, '', 3, '0.495', ''],
    [12.345, '%', 3, '12.3', '%'],
    [4e-4, 'm²', 2, '4.0', 'cm²'],
    [25e-6, 'm²', 2, '25', 'mm²'],
    [1.5e-8, 'm²', 2, '0.015', 'mm²'],
    [99.99e-6, 'm²', 3, '1.00', 'cm²'],
    [2, 'm²', 2, '2.0', 'm²'],
    [40.4, 'dBµV/m', 3, '40.4', 'dBµV/m'],
    [1e15, 'Hz', 3, '1000', 'THz'],
    [NaN, 'V', 4, '—', 'V'],
  ] as const)('%d %s to %d digits is %s %s', (value, unit, digits, number, text) => {
    expect(formatQuantity(value, unit, digits)).toEqual({ number, unit: text })
  })

  it('keeps number and unit on one line', () => {
    expect(quantityText(5.1, 'Ω', 2)).toBe('5.1\u00a0Ω')
    expect(quantityText(0.5, '', 2)).toBe('0.50')
  })

  it('reads back to the rounded value in every unit', () => {
    const value = fc
      .record({ digits: fc.integer({ min: -99_999, max: 99_999 }), power: fc.integer({ min: -16, max: 9 }) })
      .map(({ digits, power }) => Number(`${digits}e${power}`))
    fc.assert(
      fc.property(value, fc.constantFrom(...units), fc.integer({ min: 2, max: 8 }), (item, unit, digits) => {
        const read = parseQuantity(quantityText(item, unit, digits), unit)
        expect(read).toMatchObject({ ok: true })
        const expected = Number(item.toPrecision(digits))
        expect(Math.abs((read.ok ? read.value : NaN) - expected)).toBeLessThanOrEqual(
          1e-14 * Math.abs(expected),
        )
      }),
      { numRuns: 3000 },
    )
  })
})
