import { prefixSymbols } from './si-prefix'
import { unitFacts, type Unit } from './unit'

/** A value for the eye: the digits, and the unit with its prefix, apart so that they can be set differently. */
export type FormattedQuantity = { readonly number: string; readonly unit: string }

/**
 * Writes a value in engineering notation with the given number of significant digits: 4.7e-9 F becomes "4.70" "nF".
 * Trailing zeros are kept: they say how many digits are meant. A minus is U+2212.
 */
export function formatQuantity(value: number, unit: Unit, significant = 4): FormattedQuantity {
  if (!Number.isFinite(value)) return { number: '—', unit }
  if (value === 0) return { number: '0', unit }
  if (!unitFacts(unit).takesPrefix) return inMultiple(value, unit, significant)
  const rounded = Number(value.toPrecision(significant))
  const exponent = clampExponent(Math.floor(Math.log10(Math.abs(rounded)) / 3 + 1e-12) * 3)
  const scaled = Number(`${rounded.toPrecision(significant)}`) / 10 ** exponent
  return {
    number: withMinus(plainDigits(scaled, significant)),
    unit: `${prefixSymbols[exponent] ?? ''}${unit}`,
  }
}

/** As `formatQuantity`, as one text with a no-break space: "4.700 nF". */
export function quantityText(value: number, unit: Unit, significant = 4): string {
  const formatted = formatQuantity(value, unit, significant)
  return formatted.unit === '' ? formatted.number : `${formatted.number}\u00a0${formatted.unit}`
}

/** In the largest multiple that keeps the value at 1 or above: 4e-4 m² becomes "4.000" "cm²". */
function inMultiple(value: number, unit: Unit, significant: number): FormattedQuantity {
  const rounded = Number(value.toPrecision(significant))
  const multiples = Object.entries({ ...unitFacts(unit).multiples, [unit]: 0 }).sort((a, b) => b[1] - a[1])
  const [symbol, exponent] = multiples.find(([, power]) => Math.abs(rounded) >= 10 ** power) ??
    multiples.at(-1) ?? [unit, 0]
  const scaled = exponent === 0 ? value : Number(`${rounded.toPrecision(significant)}`) / 10 ** exponent
  return { number: withMinus(plainDigits(scaled, significant)), unit: symbol }
}

function clampExponent(exponent: number): number {
  return Math.min(12, Math.max(-18, exponent))
}

/** Significant digits without a power of ten where that is readable. */
function plainDigits(value: number, significant: number): string {
  const text = value.toPrecision(significant)
  return text.includes('e') ? Number(text).toString() : text
}

const withMinus = (text: string): string => text.replace('-', '\u2212')
