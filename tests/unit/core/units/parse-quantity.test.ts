import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { parseQuantity } from '@/lib/core/units/parse-quantity'
import { prefixExponents } from '@/lib/core/units/si-prefix'
import { unitFacts, units, type Unit } from '@/lib/core/units/unit'

const refused = (text: string, unit: Unit) => {
  const read = parseQuantity(text, unit)
  return read.ok ? read.value : read.error
}

describe('values as engineers write them', () => {
  it.each([
    ['4n7', 'F', 4.7e-9],
    ['2.2 nF', 'F', 2.2e-9],
    ['2.2nF', 'F', 2.2e-9],
    ['500k', 'Hz', 500e3],
    ['2,5 us', 's', 2.5e-6],
    ['2.5 \u00b5s', 's', 2.5e-6],
    ['2.5 \u03bcs', 's', 2.5e-6],
    ['4R7', 'Ω', 4.7],
    ['2M2', 'Ω', 2.2e6],
    ['2k2Ω', 'Ω', 2200],
    ['5.1 \u2126', 'Ω', 5.1],
    ['5.1 \u03a9', 'Ω', 5.1],
    ['5.1 ohm', 'Ω', 5.1],
    ['10 kOhm', 'Ω', 10e3],
    ['1 mW', 'W', 1e-3],
    ['1 MW', 'W', 1e6],
    ['12 m', 'm', 12],
    ['12 mm', 'm', 12e-3],
    ['1e-9', 'F', 1e-9],
    ['1.5E3', 'V', 1500],
    ['−3 V', 'V', -3],
    ['+3', 'V', 3],
    ['.5', 'A', 0.5],
    ['5.', 'A', 5],
    ['  1 nH ', 'H', 1e-9],
    ['5 %', '%', 5],
    ['4 cm²', 'm²', 4e-4],
    ['25 mm2', 'm²', 25e-6],
    ['56 dBuV', 'dBµV', 56],
    ['58 MS/m', 'S/m', 58e6],
    ['100 uV/m', 'V/m', 100e-6],
    ['0.01 m2', 'm²', 0.01],
    ['0.5', '', 0.5],
  ] as const)('%s in %s', (text, unit, value) => {
    expect(refused(text, unit)).toBe(value)
  })

  it('reads the number nearest to what is written, whatever the prefix', () => {
    const prefix = fc.constantFrom(...Object.keys(prefixExponents))
    const digits = fc.integer({ min: 1, max: 999_999 })
    fc.assert(
      fc.property(digits, fc.integer({ min: 0, max: 6 }), prefix, (whole, places, symbol) => {
        const text = `${whole}e${-places}`
        const exponent = (prefixExponents[symbol] ?? 0) - places
        expect(refused(`${text} ${symbol}F`, 'F')).toBe(Number(`${whole}e${exponent}`))
      }),
    )
  })

  it('has an example for every unit that it reads itself', () => {
    for (const unit of units) {
      for (const example of unitFacts(unit).example.split(/ or |, /u)) {
        expect(parseQuantity(example, unit), `${example} for ${unit}`).toMatchObject({ ok: true })
      }
    }
  })
})

describe('what is refused, naming the unit that is expected', () => {
  it.each([
    ['', 'F', 'empty', 'a capacitance in F is expected'],
    ['   ', 'F', 'empty', 'a capacitance in F is expected'],
    ['five', 'Hz', 'not_a_number', 'a frequency in Hz is expected'],
    ['1e', 'V', 'wrong_unit', 'a voltage in V is expected'],
    ['1.2.3', 'V', 'wrong_unit', 'a voltage in V is expected'],
    ['NaN', 'V', 'not_a_number', 'a voltage in V is expected'],
    ['Infinity', 'V', 'not_a_number', 'a voltage in V is expected'],
    ['1e400', 'V', 'out_of_range', 'beyond every physical value'],
    ['1e309', 'V', 'out_of_range', 'a voltage in V is expected'],
    ['5 nH', 'F', 'wrong_unit', '“5 nH” is an inductance'],
    ['5 MHz', 's', 'wrong_unit', '“5 MHz” is a frequency'],
    ['4R7', 'F', 'wrong_unit', 'a capacitance in F is expected'],
    ['1 mHz', 'm', 'wrong_unit', 'a length in m is expected'],
    ['5 k', '%', 'wrong_unit', 'a percentage in % is expected'],
    ['5 cm²', 'm', 'wrong_unit', '“5 cm²” is an area'],
    ['5 volts', 'V', 'wrong_unit', 'has an unknown unit'],
    ['4n7n', 'F', 'wrong_unit', 'a capacitance in F is expected'],
  ] as const)('“%s” for %s', (text, unit, code, part) => {
    expect(refused(text, unit)).toMatchObject({ code, message: expect.stringContaining(part) })
  })

  it('never throws and never gives what is not finite', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 12 }), fc.constantFrom(...units), (text, unit) => {
        const read = parseQuantity(text, unit)
        if (read.ok) expect(Number.isFinite(read.value)).toBe(true)
      }),
      { numRuns: 2000 },
    )
  })
})
