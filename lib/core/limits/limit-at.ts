import { err, ok, type Result } from '../result'
import { quantityText } from '../units/format-quantity'
import type { LimitSegment, LimitTable } from './limit-table'

export type LimitError = { readonly code: 'outside_the_table'; readonly message: string }

/**
 * The limit at a frequency in Hz, in the unit of its table: straight over the logarithm of frequency,
 *
 *     L(f) = L₀ + (L₁ − L₀) lg(f/f₀)/lg(f₁/f₀)
 *
 * and the lower one of two at a transition (47 CFR 15.109(c); the same convention in CISPR 32, from memory). Errors: a
 * frequency that no segment of the table covers.
 */
export function limitAt(table: LimitTable, frequency: number): Result<number, LimitError> {
  const levels = table.segments
    .filter(({ from, to }) => frequency >= from && frequency <= to)
    .map((segment) => levelIn(segment, frequency))
  if (levels.length > 0) return ok(Math.min(...levels))
  const message = `${table.standard} class ${table.deviceClass}, ${table.detector}, has no limit at ${quantityText(frequency, 'Hz')}.`
  return err({ code: 'outside_the_table', message })
}

function levelIn({ from, to, startLevel, endLevel }: LimitSegment, frequency: number): number {
  if (startLevel === endLevel) return startLevel
  return startLevel + ((endLevel - startLevel) * Math.log(frequency / from)) / Math.log(to / from)
}

/** What must be said wherever a limit is shown whose numbers were not read in the standard itself; null otherwise. */
export function standingWarning({ standard, standing, source }: LimitTable): string | null {
  if (standing === 'read in a public copy') return null
  if (standing === 'read in a related document') {
    return `The numbers of ${standard} were read in a related document (${source}): hold them against the edition in force.`
  }
  return `The numbers of ${standard} are from memory and not verified (${source}): hold them against the document before they are relied on.`
}
