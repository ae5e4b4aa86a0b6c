import { quantityText } from './format-quantity'
import { parseQuantity } from './parse-quantity'
import type { Unit } from './unit'

/** Enough significant digits for every double (IEEE 754 binary64). */
const mostDigits = 17

/** The shortest engineering notation that reads back as the very same number: 4.2e5 Hz becomes "420 kHz". */
export function exactQuantityText(value: number, unit: Unit): string {
  for (let significant = 1; significant < mostDigits; significant += 1) {
    const text = quantityText(value, unit, significant)
    const read = parseQuantity(text, unit)
    if (read.ok && read.value === value) return text
  }
  return String(value)
}
