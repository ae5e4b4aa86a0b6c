import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { exactQuantityText } from '@/lib/core/units/exact-quantity-text'
import { parseQuantity } from '@/lib/core/units/parse-quantity'

describe('a value as short as it can be written', () => {
  it.each([
    [420e3, 'Hz', '420\u00a0kHz'],
    [9.5e-12, 'F', '9.5\u00a0pF'],
    [48, 'V', '48\u00a0V'],
    [-0.25, 'V', '−250\u00a0mV'],
    [0.15, 'm', '150\u00a0mm'],
    [10, '', '10'],
    [0, 'A', '0\u00a0A'],
  ] as const)('%d %s is %j', (value, unit, text) => {
    expect(exactQuantityText(value, unit)).toBe(text)
  })

  it('reads back to the same double, whatever the value', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, min: -1e12, max: 1e12 }), (value) => {
        const read = parseQuantity(exactQuantityText(value, 'V'), 'V')
        expect(read.ok && read.value === value).toBe(true)
      }),
    )
  })
})
