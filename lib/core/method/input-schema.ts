import type { ColumnInput, InputDefinition, InputDefinitions } from './input-definition'

type Schema = Readonly<Record<string, unknown>>

/**
 * The inputs of a method as a JSON Schema (draft 2020-12): what a program has to send. A quantity is a number in its
 * SI unit or text in engineering notation; the unit is annotated.
 */
export const inputSchema = (definitions: InputDefinitions): Schema => ({
  $schema: 'https://json-schema.org/draft/2020-12/schema',
  type: 'object',
  additionalProperties: false,
  required: Object.entries(definitions)
    .filter(([, { isRequired }]) => isRequired)
    .map(([key]) => key),
  properties: Object.fromEntries(Object.entries(definitions).map(([key, item]) => [key, schemaOf(item)])),
})

function schemaOf(definition: InputDefinition): Schema {
  const described = { title: definition.label, description: definition.help }
  switch (definition.kind) {
    case 'choice':
      return { ...described, enum: Object.keys(definition.options) }
    case 'table':
      return {
        ...described,
        type: ['array', 'string'],
        minItems: definition.leastRows,
        maxItems: definition.mostRows,
        items: {
          type: 'object',
          additionalProperties: false,
          required: Object.entries(definition.columns)
            .filter(([, { fallback }]) => fallback === undefined)
            .map(([key]) => key),
          properties: Object.fromEntries(
            Object.entries(definition.columns).map(([key, column]) => [key, columnSchema(column)]),
          ),
        },
      }
    default:
      return { ...described, ...numberSchema(definition) }
  }
}

const columnSchema = (column: ColumnInput): Schema => ({
  title: column.label,
  ...(column.unit === 'text' ? { type: 'string' } : numberSchema(column)),
  ...(column.fallback === undefined ? {} : { default: column.fallback }),
})

type Bounded = Pick<ColumnInput, 'unit' | 'above' | 'atLeast' | 'atMost'>

const numberSchema = ({ unit, above, atLeast, atMost }: Bounded): Schema => ({
  type: ['number', 'string'],
  unit,
  ...(above === undefined ? {} : { exclusiveMinimum: above }),
  ...(atLeast === undefined ? {} : { minimum: atLeast }),
  ...(atMost === undefined ? {} : { maximum: atMost }),
})
