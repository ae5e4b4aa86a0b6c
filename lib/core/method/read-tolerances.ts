import { err, ok, type Result } from '../result'
import { parseTolerance, type Tolerance } from '../uncertainty/tolerance'
import { isQuantity, type InputDefinitions, type PlainValues } from './input-definition'
import type { MethodError } from './method'

/** A tolerance as it comes from a person ("5 %", "0.2 pF", "2 % k=2") or from a stored run. */
export type RawTolerance = string | Tolerance

/** The field name under which the tolerance of an input is reported. */
export const toleranceField = (key: string): string => `tolerances.${key}`

/**
 * Reads the tolerances of a method's inputs. An empty text and a width of 0 mean none.
 * Every tolerance that is unreadable, or of an input that has no value, is named with a sentence.
 */
export function readTolerances(
  definitions: InputDefinitions,
  values: PlainValues,
  raw: Readonly<Record<string, RawTolerance>>,
): Result<Readonly<Record<string, Tolerance>>, MethodError> {
  const tolerances: Record<string, Tolerance> = {}
  const fields: Record<string, string> = {}
  for (const [key, given] of Object.entries(raw)) {
    if (typeof given === 'string' && given.trim() === '') continue
    const read = readOne(definitions, values, key, given)
    if (!read.ok) fields[toleranceField(key)] = read.error
    else if (read.value.halfWidth > 0) tolerances[key] = read.value
  }
  if (Object.keys(fields).length === 0) return ok(tolerances)
  return err({ code: 'invalid_input', message: 'Some tolerances need another look.', fields })
}

function readOne(
  definitions: InputDefinitions,
  values: PlainValues,
  key: string,
  given: RawTolerance,
): Result<Tolerance, string> {
  const definition = Object.hasOwn(definitions, key) ? definitions[key] : undefined
  if (definition === undefined) return err(`This method has no input “${key}”.`)
  if (!isQuantity(definition)) return err(`${definition.label} takes no tolerance.`)
  const value = Object.hasOwn(values, key) ? values[key] : undefined
  if (typeof value !== 'number') return err(`${definition.label} is left empty, so it has no tolerance.`)
  if (typeof given === 'string') return parseTolerance(given, value, definition.unit)
  const isUsable = Number.isFinite(given.halfWidth) && given.halfWidth >= 0
  return isUsable ? ok(given) : err('A tolerance must be a finite number, not below 0.')
}
