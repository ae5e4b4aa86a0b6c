import { err, ok, type Result } from '../result'
import { parseQuantity } from '../units/parse-quantity'
import type { Unit } from '../units/unit'

/**
 * How far a value may be from the stated one. `rectangular`: anywhere within ± halfWidth alike, as the tolerance of a
 * part. `normal`: halfWidth is the expanded uncertainty for a coverage factor of 2, as a calibration states it.
 */
export type Tolerance = {
  readonly halfWidth: number
  readonly distribution: 'rectangular' | 'normal'
}

const coverageSuffix = /\s*\(?k\s*=\s*2\)?$/iu
const relativeForm = /^(.*?)\s*(%|ppm)$/u
const relativeUnits: Readonly<Record<string, number>> = { '%': 1e-2, ppm: 1e-6 }

/**
 * Reads the tolerance of a value: "5 %" or "50 ppm" of it, or a quantity in its own unit, "0.2 pF"; "k=2" behind it
 * makes it an expanded uncertainty. An optional "±" is read over.
 *
 * Error: a sentence that says what is expected. Negative tolerances are refused.
 */
export function parseTolerance(text: string, value: number, unit: Unit): Result<Tolerance, string> {
  const trimmed = text.trim().replace(/^(±|\+\/?-)\s*/u, '')
  const distribution = coverageSuffix.test(trimmed) ? 'normal' : 'rectangular'
  const size = trimmed.replace(coverageSuffix, '')
  const [, relative, sign = ''] = relativeForm.exec(size) ?? []
  // A value that is itself in per cent has its tolerance in the same.
  const isRelative = relative !== undefined && sign !== unit
  const parsed = isRelative ? parseQuantity(relative, '') : parseQuantity(size, unit)
  if (!parsed.ok || parsed.value < 0) {
    const absolute = unit === '' ? 'a number' : `a value in ${unit}`
    return err(`“${text.trim()}” is not a tolerance; enter a part such as 5 % or 50 ppm, or ${absolute}.`)
  }
  const halfWidth = isRelative ? Math.abs(value) * parsed.value * (relativeUnits[sign] ?? 0) : parsed.value
  return ok({ halfWidth, distribution })
}
