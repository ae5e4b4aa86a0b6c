import { prefixSymbols } from '@/lib/core/units/si-prefix'

/** Units that take a prefix; decibels, per cent, degrees and pure numbers never do. */
const prefixable = /^(s|Hz|V|A|Ω|F|H|W|m|T|J|C|S|Wb)([/·].*)?$/

const lowest = -18
const highest = 12

export type EngineeringScale = { readonly exponent: number; readonly unit: string }

/** The prefix under which `value` reads between 1 and 999, and the unit with that prefix written before it. */
export const engineeringScale = (value: number, unit: string): EngineeringScale => {
  const size = Math.abs(value)
  if (!prefixable.test(unit) || size === 0 || !Number.isFinite(size)) return { exponent: 0, unit }
  // The small excess keeps 1e-9 and 1e6, which logarithms miss by a few parts in 1e16, on their own prefix.
  const thousands = Math.floor(Math.log10(size) / 3 + 1e-12)
  const exponent = Math.min(highest, Math.max(lowest, thousands * 3))
  return { exponent, unit: `${prefixSymbols[exponent] ?? ''}${unit}` }
}

/** A number with a true minus sign and no trailing zeros beyond `decimals`; never "−0". */
export const plainNumber = (value: number, decimals: number): string => {
  const text = value.toFixed(Math.min(20, Math.max(0, decimals)))
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '−')
}

export type EngineeringLabel = { readonly number: string; readonly unit: string }

/** `value` in engineering notation with the given significant digits: 1.8e8 Hz becomes "180" "MHz". */
export const engineeringLabel = (value: number, unit: string, significant = 4): EngineeringLabel => {
  if (value === 0 || !Number.isFinite(value)) return { number: Number.isFinite(value) ? '0' : '–', unit }
  // Rounding first lets 999.96e6 become 1.000 G, not 1000 M.
  const rounded = Number(value.toPrecision(significant))
  const scale = engineeringScale(rounded, unit)
  const scaled = rounded / 10 ** scale.exponent
  const decimals = significant - 1 - Math.floor(Math.log10(Math.abs(scaled)) + 1e-12)
  return { number: plainNumber(scaled, decimals), unit: scale.unit }
}

/** The shortest exact form of a round value, for an axis: 3e7 Hz becomes "30 MHz". */
export const roundLabel = (value: number, unit: string): string => {
  const scale = engineeringScale(value, unit)
  const digits = Number((value / 10 ** scale.exponent).toPrecision(6)).toString()
  return [digits.replace('-', '−'), scale.unit].filter(Boolean).join('\u00a0')
}

/** Labels for a column of values that are read against each other: one prefix for all, as many decimals as the largest needs. */
export const columnLabels = (
  values: readonly number[],
  unit: string,
  significant = 4,
): EngineeringLabel[] => {
  const finite = values.filter(Number.isFinite)
  const largest = finite.reduce((most, value) => Math.max(most, Math.abs(value)), 0)
  const scale = engineeringScale(Number(largest.toPrecision(significant)), unit)
  const factor = 10 ** scale.exponent
  const digits = largest > 0 ? Math.floor(Math.log10(largest / factor) + 1e-12) : 0
  const decimals = Math.max(0, significant - 1 - digits)
  return values.map((value) => ({
    number: Number.isFinite(value) ? plainNumber(value / factor, decimals) : '–',
    unit: scale.unit,
  }))
}
