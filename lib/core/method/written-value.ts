import { exactQuantityText } from '../units/exact-quantity-text'
import {
  isQuantity,
  type InputDefinition,
  type PlainRow,
  type PlainValue,
  type TableInput,
} from './input-definition'

/** Rows beyond this many are counted, not written. */
const mostWrittenRows = 12

/** The value of an input for the eye, with every digit that it has: "8 nH", "Flat trace", "0 m; 20 mm | 20 mm; 0 m". */
export function writtenValue(definition: InputDefinition, value: PlainValue): string {
  if (isQuantity(definition)) return exactQuantityText(Number(value), definition.unit)
  if (definition.kind === 'choice') return definition.options[String(value)] ?? String(value)
  if (!Array.isArray(value)) return String(value)
  const rows: readonly PlainRow[] = value
  return rows.length > mostWrittenRows
    ? `${rows.length} rows`
    : rows.map((row) => writtenRow(definition, row)).join(' | ')
}

const writtenRow = ({ columns }: TableInput, row: PlainRow): string =>
  Object.entries(columns)
    .map(([key, { unit }]) => {
      const cell = row[key] ?? ''
      return unit === 'text' || typeof cell === 'string' ? String(cell) : exactQuantityText(cell, unit)
    })
    .join('; ')
