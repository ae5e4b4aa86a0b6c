import { err, ok, type Result } from '../result'
import { parseQuantity } from '../units/parse-quantity'
import { quantityText } from '../units/format-quantity'
import type { InputDefinition, InputDefinitions, MethodError } from './method'

/** A value as it comes from a person or a program: text in engineering notation, or a number in the SI unit. */
export type RawInput = string | number

/**
 * Reads the inputs of a method from text or numbers and applies their bounds.
 * Every value that is missing, unreadable, unknown or out of bounds is named with a sentence.
 */
export function readInputs(
  definitions: InputDefinitions,
  raw: Readonly<Record<string, RawInput>>,
): Result<Readonly<Record<string, number>>, MethodError> {
  const values: Record<string, number> = {}
  const unknown = Object.keys(raw).filter((key) => !Object.hasOwn(definitions, key))
  // Built from entries, so that a key such as “__proto__” is a field like any other.
  const fields: Record<string, string> = Object.fromEntries(
    unknown.map((key) => [key, `This method has no input “${key}”.`]),
  )
  for (const [key, definition] of Object.entries(definitions)) {
    const given = Object.hasOwn(raw, key) ? raw[key] : undefined
    if (given === undefined || given === '') {
      if (definition.isRequired) fields[key] = `${definition.label} is needed.`
      continue
    }
    const read = readValue(definition, given)
    if (read.ok) values[key] = read.value
    else fields[key] = read.error
  }
  if (Object.keys(fields).length === 0) return ok(values)
  return err({ code: 'invalid_input', message: 'Some inputs need another look.', fields })
}

function readValue(definition: InputDefinition, given: RawInput): Result<number, string> {
  const parsed = typeof given === 'number' ? ok(given) : parseQuantity(given, definition.unit)
  if (!parsed.ok) return err(parsed.error.message)
  const problem = boundProblem(definition, parsed.value)
  return problem === null ? parsed : err(problem)
}

/** What is wrong with a value, as a sentence; null where it is within the bounds of its input. */
export function boundProblem(
  { label, unit, above, atLeast, atMost }: InputDefinition,
  value: number,
): string | null {
  if (!Number.isFinite(value)) return `${label} must be a finite number.`
  if (above !== undefined && value <= above) return `${label} must be more than ${quantityText(above, unit)}.`
  if (atLeast !== undefined && value < atLeast)
    return `${label} must be at least ${quantityText(atLeast, unit)}.`
  if (atMost !== undefined && value > atMost) return `${label} can be at most ${quantityText(atMost, unit)}.`
  return null
}
