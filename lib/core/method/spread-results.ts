import { err, ok, type Result } from '../result'
import { propagate, type Uncertainty } from '../uncertainty/propagate'
import type { Tolerance } from '../uncertainty/tolerance'
import { boundProblem } from './bound-problem'
import { isQuantity, type InputDefinitions, type InputValues, type PlainValues } from './input-definition'
import { noSolution, type Method, type MethodError, type ResultValue } from './method'
import { toleranceField } from './read-tolerances'

/** The 95 % intervals of the results of a run, from the tolerances of its inputs; null where there are none. */
export function spreadResults<Inputs extends InputDefinitions>(
  method: Method<Inputs>,
  values: PlainValues,
  tolerances: Readonly<Record<string, Tolerance>>,
): Result<Uncertainty | null, MethodError> {
  const keys = Object.keys(tolerances)
  if (keys.length === 0) return ok(null)
  const inputs = Object.entries(tolerances).map(([key, tolerance]) => ({
    key,
    value: Number(values[key] ?? 0),
    tolerance,
    isPossible: (drawn: number) => isPossible(method.inputs, key, drawn),
  }))
  const spread = propagate(inputs, (drawn) => resultsAt(method, { ...values, ...drawn }))
  if (spread.ok) return spread
  const reason = spread.error?.message ?? 'No possible value lies within it.'
  const message = `Within these tolerances there are values for which the method has no answer: ${reason} Narrow a tolerance.`
  return err(noSolution(message, ...keys.map(toleranceField)))
}

const isPossible = (definitions: InputDefinitions, key: string, value: number): boolean => {
  const definition = definitions[key]
  return definition !== undefined && isQuantity(definition) && boundProblem(definition, value) === null
}

function resultsAt<Inputs extends InputDefinitions>(
  method: Method<Inputs>,
  values: PlainValues,
): Result<Readonly<Record<string, number>>, MethodError> {
  // The values hold every required input: they are those of a run that went well, with some of them moved.
  const typed = values as InputValues<Inputs>
  const results = method.computeResults?.(typed)
  if (results) return results.ok ? finite(results.value) : results
  const outcome = method.compute(typed)
  return outcome.ok ? finite(outcome.value.results) : outcome
}

function finite(results: readonly ResultValue[]): Result<Readonly<Record<string, number>>, MethodError> {
  const broken = results.find((result) => !Number.isFinite(result.value))
  if (broken) return err(noSolution(`${broken.label} is not finite.`))
  return ok(Object.fromEntries(results.map(({ key, value }) => [key, value])))
}
