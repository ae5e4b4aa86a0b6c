import { quantityText } from '@/lib/core/units/format-quantity'
import { parseQuantity } from '@/lib/core/units/parse-quantity'
import type { Unit } from '@/lib/core/units/unit'

/** The shortest engineering notation that reads back as the very same number; empty where nothing is known. */
export function entryText(value: number | null, unit: Unit): string {
  if (value === null) return ''
  for (let significant = 1; significant <= 15; significant += 1) {
    const text = quantityText(value, unit, significant).replace('\u00a0', ' ')
    const read = parseQuantity(text, unit)
    if (read.ok && read.value === value) return text
  }
  return String(value)
}
