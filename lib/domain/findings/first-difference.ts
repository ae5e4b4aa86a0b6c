import type { Unit } from '@/lib/core/units/unit'

import type { RunOutcome } from './run-record'

/**
 * The first thing in which two outcomes of the same run differ, as a sentence; null when they are the same to the last
 * digit. Values are compared as doubles, not as they are printed.
 */
export function firstDifference(stored: RunOutcome, repeated: RunOutcome): string | null {
  return (
    valueDifference(stored, repeated) ??
    intervalDifference(stored, repeated) ??
    choiceDifference(stored, repeated) ??
    (isEqual(stored.absence, repeated.absence) ? null : 'The answer in words differs.') ??
    (isEqual(stored.validity, repeated.validity) ? null : 'The checked limits differ.') ??
    (isEqual(stored.warnings, repeated.warnings) ? null : 'The warnings differ.') ??
    (isEqual(stored.figures, repeated.figures) ? null : 'The figure differs.')
  )
}

function valueDifference(stored: RunOutcome, repeated: RunOutcome): string | null {
  const fresh = new Map(repeated.results.map((result) => [result.key, result]))
  for (const { key, label, unit, value } of stored.results) {
    const again = fresh.get(key)
    if (!again) return `${label} is stored as ${digits(value, unit)}; repeated, there is no such result.`
    if (again.value !== value) {
      return `${label} is stored as ${digits(value, unit)}; repeated, it is ${digits(again.value, unit)}.`
    }
  }
  return isEqual(stored.results, repeated.results) ? null : 'The list of results differs.'
}

function intervalDifference(stored: RunOutcome, repeated: RunOutcome): string | null {
  for (const [index, interval] of (stored.uncertainty?.intervals ?? []).entries()) {
    if (isEqual(interval, repeated.uncertainty?.intervals[index])) continue
    const result = stored.results.find(({ key }) => key === interval.key)
    return `The interval of ${result?.label ?? interval.key} differs.`
  }
  return isEqual(stored.uncertainty, repeated.uncertainty) ? null : 'The intervals differ.'
}

function choiceDifference(stored: RunOutcome, repeated: RunOutcome): string | null {
  for (const [index, table] of stored.choices.entries()) {
    if (!isEqual(table, repeated.choices[index])) return `The table “${table.title}” differs.`
  }
  return stored.choices.length === repeated.choices.length ? null : 'The tables differ.'
}

/** Every digit of the double: a printed value would hide a difference in the last ones. */
const digits = (value: number, unit: Unit): string => (unit === '' ? `${value}` : `${value} ${unit}`)

const isEqual = (one: unknown, other: unknown): boolean => JSON.stringify(one) === JSON.stringify(other)
