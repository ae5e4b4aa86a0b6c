import { quantityText } from '../units/format-quantity'
import { isQuantity, type ColumnInput, type InputDefinition } from './input-definition'

/** What an input may be, in words: "more than 0 Hz, at most 1 MHz". */
export function writtenBounds(definition: InputDefinition): string {
  if (isQuantity(definition)) return boundsText(definition)
  if (definition.kind === 'choice') return Object.values(definition.options).join(', ')
  const columns = Object.values(definition.columns).map((column) =>
    column.unit === 'text' ? column.label : `${column.label}: ${boundsText(column)}`,
  )
  return `${definition.leastRows} to ${definition.mostRows} rows of ${columns.join('; ')}`
}

type Bounded = Pick<ColumnInput, 'unit' | 'above' | 'atLeast' | 'atMost'>

function boundsText({ unit, above, atLeast, atMost }: Bounded): string {
  const written = (value: number) => quantityText(value, unit === 'text' ? '' : unit, 3)
  const parts = [
    ...(above === undefined ? [] : [`more than ${written(above)}`]),
    ...(atLeast === undefined ? [] : [`at least ${written(atLeast)}`]),
    ...(atMost === undefined ? [] : [`at most ${written(atMost)}`]),
  ]
  if (parts.length > 0) return parts.join(', ')
  return unit === '' || unit === 'text' ? 'any number' : `any value in ${unit}`
}
