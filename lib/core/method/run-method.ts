import { err, ok, type Result } from '../result'
import type { Uncertainty } from '../uncertainty/propagate'
import type { Tolerance } from '../uncertainty/tolerance'
import type { InputDefinitions, InputValues, PlainValues, RawInput } from './input-definition'
import { noSolution, type Method, type MethodError, type MethodOutcome } from './method'
import { readInputs } from './read-inputs'
import { readTolerances, type RawTolerance } from './read-tolerances'
import { spreadResults } from './spread-results'

/** What a run stores, as plain JSON: everything that is needed to repeat it and to compare. */
export type MethodRun = {
  readonly methodId: string
  readonly methodVersion: number
  readonly values: PlainValues
  /** Those that are more than 0, in the units of their inputs. */
  readonly tolerances: Readonly<Record<string, Tolerance>>
  readonly outcome: MethodOutcome
  /** The intervals of the results; null where no tolerance is given. */
  readonly uncertainty: Uncertainty | null
}

/**
 * Runs a method on raw inputs, and on raw tolerances of any of them. The result is the same, digit for digit, whenever
 * it is repeated: running a stored run's `values` and `tolerances` gives that run.
 *
 * Errors: `invalid_input` names the fields; `no_solution` where a result, a table or a figure would hold something that
 * is not a finite number: a number that cannot be shown is never passed on.
 */
export function runMethod<Inputs extends InputDefinitions>(
  method: Method<Inputs>,
  raw: Readonly<Record<string, RawInput>>,
  rawTolerances: Readonly<Record<string, RawTolerance>> = {},
): Result<MethodRun, MethodError> {
  const read = readInputs(method.inputs, raw)
  if (!read.ok) return read
  // `readInputs` has made sure that every required input is there.
  const outcome = method.compute(read.value as InputValues<Inputs>)
  if (!outcome.ok) return outcome
  const problem = whatIsNotFinite(outcome.value)
  if (problem !== null) {
    return err(noSolution(`These inputs give no finite ${problem}. Check their units and sizes.`))
  }
  const values = { ...read.value, ...proposals(method.inputs, read.value, outcome.value) }
  const tolerances = readTolerances(method.inputs, values, rawTolerances)
  if (!tolerances.ok) return tolerances
  const uncertainty = spreadResults(method, values, tolerances.value)
  if (!uncertainty.ok) return uncertainty
  return ok({
    methodId: method.id,
    methodVersion: method.version,
    values: read.value,
    tolerances: tolerances.value,
    outcome: outcome.value,
    uncertainty: uncertainty.value,
  })
}

function proposals(definitions: InputDefinitions, values: PlainValues, outcome: MethodOutcome): PlainValues {
  const proposed = outcome.results.filter(
    ({ key }) => Object.hasOwn(definitions, key) && !Object.hasOwn(values, key),
  )
  return Object.fromEntries(proposed.map(({ key, value }) => [key, value]))
}

function whatIsNotFinite({ results, choices, figures }: MethodOutcome): string | null {
  const broken = results.find((result) => !Number.isFinite(result.value))
  if (broken) return broken.label.toLowerCase()
  if (
    !choices.every(({ rows }) =>
      rows.flat().every((cell) => typeof cell === 'string' || Number.isFinite(cell)),
    )
  )
    return 'alternatives'
  const isDrawable = figures.every(({ series }) =>
    series.every(({ x, y }) => x.every(Number.isFinite) && y.every(Number.isFinite)),
  )
  return isDrawable ? null : 'figure'
}
