import { unitOf, type WrittenUnit } from './unit-text'

/** The title of a column, taken apart. */
export type ColumnTitle = { readonly name: string; readonly unit: WrittenUnit | null }

const bracketed = /^(.*?)\s*[[({]\s*([^[\](){}]*?)\s*[\])}]$/u
const suffixed = /^(.+)[_ ]([^_ ]+)$/u

/** Reads "time [s]", "Kanal 1 (mV)", "ch1_V" or "volts" into name and unit. */
export function titleOf(cell: string): ColumnTitle {
  const text = unquoted(cell)
  for (const pattern of [bracketed, suffixed]) {
    const [, name = '', written = ''] = pattern.exec(text) ?? []
    const unit = unitOf(written)
    if (unit !== null) return { name: name.trim(), unit }
  }
  // One letter may be a quantity as well as a unit: "s" or "A" over a column says nothing certain.
  return { name: text, unit: text.length > 1 ? unitOf(text) : null }
}

/** The unit that a cell of a row of units holds: "mV", "(mV)"; null if it holds something else. */
export const unitCell = (cell: string): WrittenUnit | null =>
  unitOf(unquoted(cell).replace(/^[[(](.*)[\])]$/u, '$1'))

export const unquoted = (cell: string): string =>
  cell
    .trim()
    .replace(/^"(.*)"$/u, '$1')
    .trim()
