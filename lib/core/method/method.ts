import type { Figure } from '../figure/figure'
import type { Result } from '../result'
import type { Unit } from '../units/unit'
import type { InputDefinitions, InputValues, RawInput } from './input-definition'

/** One value that a method gives, a main result or a step on the way to it. */
export type ResultValue = {
  readonly key: string
  readonly label: string
  readonly symbol: string
  readonly unit: Unit
  readonly value: number
  readonly role: 'main' | 'intermediate'
}

/** A limit of the model that was checked against the very values of a run. */
export type ValidityCheck = { readonly passed: boolean; readonly sentence: string }

export type Source = {
  readonly citation: string
  readonly standing: 'published' | 'derived here, checked from outside' | 'common practice, no source'
}

/** Alternatives or steps side by side, one a row; values in SI units, names in text columns. */
export type ChoiceTable = {
  readonly title: string
  readonly columns: readonly { readonly label: string; readonly unit: Unit | 'text' }[]
  readonly rows: readonly (readonly (number | string)[])[]
}

export type MethodOutcome = {
  readonly results: readonly ResultValue[]
  readonly choices: readonly ChoiceTable[]
  readonly validity: readonly ValidityCheck[]
  readonly figures: readonly Figure[]
}

export type MethodError = {
  readonly code: 'invalid_input' | 'no_solution'
  readonly message: string
  readonly fields: Readonly<Record<string, string>>
}

/**
 * A method of the practice: everything that a form, a run, a figure, a report and a reference page need to know of it.
 * A change that alters results is a new version.
 */
export type Method<Inputs extends InputDefinitions = InputDefinitions> = {
  readonly id: string
  readonly version: number
  readonly title: string
  readonly purpose: string
  readonly inputs: Inputs
  readonly formulas: readonly string[]
  readonly notes: readonly string[]
  readonly cautions: readonly string[]
  readonly sources: readonly Source[]
  /** Inputs of a worked example, as a person would type them. */
  readonly example: Readonly<Record<string, RawInput>>
  /** A result with the key of an input that was left empty is what the method proposes for that input. */
  readonly compute: (values: InputValues<Inputs>) => Result<MethodOutcome, MethodError>
  /**
   * The results alone, with every proposal already among the values: for the thousands of draws of an interval. May
   * leave out results that need no interval. Absent where `compute` is quick enough.
   */
  readonly computeResults?: (values: InputValues<Inputs>) => Result<readonly ResultValue[], MethodError>
}

/** Keeps the exact input types of a definition. */
export const defineMethod = <const Inputs extends InputDefinitions>(method: Method<Inputs>): Method<Inputs> =>
  method

/** A refusal that names the inputs it is about. */
export const noSolution = (message: string, ...fields: readonly string[]): MethodError => ({
  code: 'no_solution',
  message,
  fields: Object.fromEntries(fields.map((field) => [field, message])),
})
