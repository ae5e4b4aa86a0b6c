import { limitAt } from './limit-at'
import type { LimitDetector, LimitTable } from './limit-table'

export type ScanPoint = { readonly frequency: number; readonly level: number }

export type PointMargin = ScanPoint & {
  readonly limit: number
  /** Limit minus level, in dB: below 0 is over the limit. */
  readonly margin: number
}

/** The margins of the points that a table has a limit for, the smallest first; a correction in dB is added to each level. */
export const marginsOf = (
  points: readonly ScanPoint[],
  table: LimitTable,
  correction: number,
): readonly PointMargin[] =>
  points
    .flatMap(({ frequency, level }) => {
      const limit = limitAt(table, frequency)
      const corrected = level + correction
      return limit.ok
        ? [{ frequency, level: corrected, limit: limit.value, margin: limit.value - corrected }]
        : []
    })
    .sort((a, b) => a.margin - b.margin)

/** Detectors by how high they read: average, quasi-peak, peak. */
const order: readonly LimitDetector[] = ['average', 'quasi-peak', 'peak']

/** What a scan with one detector can say against a limit for another. */
export function detectorVerdict(
  measured: LimitDetector,
  table: LimitTable,
): { passed: boolean; sentence: string } {
  if (measured === table.detector)
    return { passed: true, sentence: `The scan used the ${measured} detector of the limit.` }
  if (order.indexOf(measured) > order.indexOf(table.detector)) {
    const sentence = `The scan used the ${measured} detector, which never reads less than ${table.detector}: points below the limit are below it, points above need a measurement with ${table.detector}.`
    return { passed: true, sentence }
  }
  const sentence = `The scan used the ${measured} detector, which may read less than the ${table.detector} of this limit: a margin says nothing.`
  return { passed: false, sentence }
}
