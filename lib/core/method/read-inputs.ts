import { err, ok, type Result } from '../result'
import { parseQuantity } from '../units/parse-quantity'
import { boundProblem } from './bound-problem'
import type {
  ChoiceInput,
  InputDefinition,
  InputDefinitions,
  PlainValue,
  PlainValues,
  QuantityInput,
  RawInput,
} from './input-definition'
import type { MethodError } from './method'
import { readTable } from './read-table'

/**
 * Reads the inputs of a method from text or numbers and applies their bounds.
 * Every value that is missing, unreadable, unknown or out of bounds is named with a sentence.
 */
export function readInputs(
  definitions: InputDefinitions,
  raw: Readonly<Record<string, RawInput>>,
): Result<PlainValues, MethodError> {
  const values: Record<string, PlainValue> = {}
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

function readValue(definition: InputDefinition, given: RawInput): Result<PlainValue, string> {
  switch (definition.kind) {
    case 'choice':
      return readChoice(definition, given)
    case 'table':
      return readTable(definition, given)
    default:
      return readQuantity(definition, given)
  }
}

function readQuantity(definition: QuantityInput, given: RawInput): Result<number, string> {
  if (typeof given === 'object') return err(`${definition.label} is one value, not a list.`)
  const parsed = typeof given === 'number' ? ok(given) : parseQuantity(given, definition.unit)
  if (!parsed.ok) return err(parsed.error.message)
  const problem = boundProblem(definition, parsed.value)
  // A zero has no sign: stored as JSON it would come back without it.
  return problem === null ? ok(parsed.value + 0) : err(problem)
}

function readChoice({ label, options }: ChoiceInput, given: RawInput): Result<string, string> {
  if (typeof given === 'string' && Object.hasOwn(options, given)) return ok(given)
  return err(`${label} is one of: ${Object.keys(options).join(', ')}.`)
}
