import { err, ok, type Result } from '../result'
import { prefixExponents } from './si-prefix'
import { unitFacts, units, type Unit } from './unit'

export type QuantityError = {
  readonly code: 'empty' | 'not_a_number' | 'wrong_unit' | 'out_of_range'
  readonly message: string
}

/** Digits with an optional sign, point or comma, and power of ten; then whatever follows. */
const plainForm = /^([+-]?)(\d+(?:[.,]\d*)?|[.,]\d+)(?:e([+-]?\d{1,3}))?\s*(.*)$/iu

/** A prefix or R in the place of the decimal point, as in 4n7, 2M2 and 4R7. */
const infixForm = /^([+-]?)(\d+)([afpnu\u00b5\u03bcmkKMGTR])(\d+)\s*(.*)$/u

/**
 * Reads a value in engineering notation ("4n7", "2.2 nF", "500k", "2,5 us", "4R7", "1e-9") as a number in the given SI
 * unit. Upper and lower case of prefixes are kept apart: "1 mW" is 1e-3 and "1 MW" is 1e6. The digits are converted
 * once, together with the prefix, so the result is the double nearest to what was written.
 *
 * Errors: `empty`, `not_a_number`, `wrong_unit` (names the unit that is expected), `out_of_range` (not a finite double).
 */
export function parseQuantity(text: string, unit: Unit): Result<number, QuantityError> {
  const given = text.trim()
  const trimmed = normalised(given)
  if (trimmed === '') return err(failure('empty', unit, `Enter ${unitFacts(unit).quantity}`))
  const infix = infixForm.exec(trimmed)
  if (infix) {
    const [, sign = '', whole = '', mark = '', fraction = '', rest = ''] = infix
    if (mark === 'R' && unit !== 'Ω') return err(wrongUnit(given, unit))
    const exponent = mark === 'R' ? 0 : (prefixExponents[mark] ?? 0)
    if (exponent !== 0 && !unitFacts(unit).takesPrefix) return err(wrongUnit(given, unit))
    return isSpellingOf(rest, unit) || rest === ''
      ? finite(`${sign}${whole}.${fraction}`, exponent, unit)
      : err(wrongUnit(given, unit))
  }
  const plain = plainForm.exec(trimmed)
  if (!plain) return err(failure('not_a_number', unit, `“${given}” is not a number`))
  const [, sign = '', digits = '', power = '0', suffix = ''] = plain
  const exponent = exponentOf(suffix, unit)
  if (exponent === null) return err(wrongUnit(given, unit))
  return finite(`${sign}${digits.replace(',', '.')}`, exponent + Number(power), unit)
}

/** One spelling of what looks alike: µ, Ω, ² and the minus each have several code points. */
const normalised = (text: string): string => text.normalize('NFKC').replaceAll('\u2212', '-').trim()

/** The power of ten of a suffix such as "", "n", "nF" or "F"; null when it belongs to another unit. */
function exponentOf(suffix: string, unit: Unit): number | null {
  if (suffix === '' || isSpellingOf(suffix, unit)) return 0
  const multiple = multipleOf(suffix, unit)
  if (multiple !== undefined) return multiple
  if (!unitFacts(unit).takesPrefix) return null
  for (const [prefix, exponent] of Object.entries(prefixExponents)) {
    if (prefix === '' || !suffix.startsWith(prefix)) continue
    const rest = suffix.slice(prefix.length)
    if (rest === '' || isSpellingOf(rest, unit)) return exponent
  }
  return null
}

/** Whether a suffix is a unit with or without a prefix, but not a prefix alone. */
function endsInUnit(suffix: string, unit: Unit): boolean {
  if (isSpellingOf(suffix, unit) || multipleOf(suffix, unit) !== undefined) return true
  if (!unitFacts(unit).takesPrefix) return false
  return Object.keys(prefixExponents).some(
    (prefix) => suffix.startsWith(prefix) && isSpellingOf(suffix.slice(prefix.length), unit),
  )
}

const isSpellingOf = (text: string, unit: Unit): boolean =>
  text !== '' && (text === unit.normalize('NFKC') || unitFacts(unit).spellings.includes(text))

function multipleOf(suffix: string, unit: Unit): number | undefined {
  const multiples = Object.entries(unitFacts(unit).multiples ?? {})
  return multiples.find(([symbol]) => symbol.normalize('NFKC') === suffix)?.[1]
}

function finite(mantissa: string, exponent: number, unit: Unit): Result<number, QuantityError> {
  const value = Number(`${mantissa}e${exponent}`)
  if (Number.isFinite(value)) return ok(value)
  return err(failure('out_of_range', unit, 'This is beyond every physical value'))
}

function wrongUnit(text: string, unit: Unit): QuantityError {
  const suffix = plainForm.exec(normalised(text))?.[4] ?? ''
  const other = units.find((candidate) => candidate !== unit && endsInUnit(suffix, candidate))
  const found = other ? `“${text}” is ${unitFacts(other).quantity}` : `“${text}” has an unknown unit`
  return failure('wrong_unit', unit, found)
}

function failure(code: QuantityError['code'], unit: Unit, found: string): QuantityError {
  const { quantity, example } = unitFacts(unit)
  const wanted = unit === '' ? quantity : `${quantity} in ${unit}`
  return { code, message: `${found}; ${wanted} is expected here, such as ${example}.` }
}
