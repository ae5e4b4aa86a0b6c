import type { Unit } from '../units/unit'

type Described = {
  readonly label: string
  readonly symbol: string
  readonly help: string
  readonly isRequired: boolean
}

type Bounds = { readonly above?: number; readonly atLeast?: number; readonly atMost?: number }

/** One physical value. */
export type QuantityInput = Described &
  Bounds & {
    readonly kind?: 'quantity'
    readonly unit: Unit
    /** What a form offers where nothing is known of the value: "5 %" for a part. */
    readonly usualTolerance?: string
  }

/** One of a few named alternatives; the value is the key of the chosen one. */
export type ChoiceInput = Described & {
  readonly kind: 'choice'
  readonly options: Readonly<Record<string, string>>
}

/** One column of a table; a text column holds names. */
export type ColumnInput = Bounds & {
  readonly label: string
  readonly symbol: string
  readonly unit: Unit | 'text'
  /** Stands for a cell that is left out or empty; without one, every row needs the cell. */
  readonly fallback?: number | string
}

/** Rows of values: the corners of a loop, the peaks of a scan. */
export type TableInput = Described & {
  readonly kind: 'table'
  readonly columns: Readonly<Record<string, ColumnInput>>
  readonly leastRows: number
  readonly mostRows: number
}

/** One value that a method takes. The form, the interface and the report are made from this. */
export type InputDefinition = QuantityInput | ChoiceInput | TableInput

export type InputDefinitions = Readonly<Record<string, InputDefinition>>

type RowOf<Columns extends TableInput['columns']> = {
  readonly [Key in keyof Columns]: Columns[Key]['unit'] extends 'text' ? string : number
}

type ValueOf<Input extends InputDefinition> = Input extends ChoiceInput
  ? keyof Input['options'] & string
  : Input extends TableInput
    ? readonly RowOf<Input['columns']>[]
    : number

/** The values of a run in SI units; an optional input may be absent. */
export type InputValues<Inputs extends InputDefinitions> = {
  readonly [Key in keyof Inputs]:
    ValueOf<Inputs[Key]> | (Inputs[Key]['isRequired'] extends true ? never : undefined)
}

export type PlainRow = Readonly<Record<string, number | string>>

/** A value without the type of its input, as a run holds it: a number, the key of a choice, or rows. */
export type PlainValue = number | string | readonly PlainRow[]

export type PlainValues = Readonly<Record<string, PlainValue>>

export const isQuantity = (definition: InputDefinition): definition is QuantityInput =>
  definition.kind === undefined || definition.kind === 'quantity'

/**
 * A value as it comes from a person or a program: a number in the SI unit, text in engineering notation, the key of a
 * choice, or rows: as text, a line each, as arrays in the order of the columns, or as objects.
 */
export type RawInput =
  number | string | readonly (readonly (number | string)[] | Readonly<Record<string, number | string>>)[]
