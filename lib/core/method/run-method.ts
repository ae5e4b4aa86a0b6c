import { err, ok, type Result } from '../result'
import type { InputDefinitions, Method, MethodError, MethodOutcome } from './method'
import { readInputs, type RawInput } from './read-inputs'

/** What a run stores: everything that is needed to repeat it and to compare. */
export type MethodRun = {
  readonly methodId: string
  readonly methodVersion: number
  readonly values: Readonly<Record<string, number>>
  readonly outcome: MethodOutcome
}

/**
 * Runs a method on raw inputs. The result is the same, digit for digit, whenever it is repeated on the same inputs.
 * A result that is not a finite number is refused: a number that cannot be shown is never passed on.
 */
export function runMethod<Inputs extends InputDefinitions>(
  method: Method<Inputs>,
  raw: Readonly<Record<string, RawInput>>,
): Result<MethodRun, MethodError> {
  const read = readInputs(method.inputs, raw)
  if (!read.ok) return read
  // `readInputs` has made sure that every required input is there.
  const outcome = method.compute(read.value as Parameters<typeof method.compute>[0])
  if (!outcome.ok) return outcome
  const broken = outcome.value.results.find((result) => !Number.isFinite(result.value))
  if (broken) {
    const message = `These inputs give no finite ${broken.label.toLowerCase()}. Check their units and sizes.`
    return err({ code: 'no_solution', message, fields: {} })
  }
  return ok({
    methodId: method.id,
    methodVersion: method.version,
    values: read.value,
    outcome: outcome.value,
  })
}
