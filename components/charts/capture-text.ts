import { engineeringLabel } from '@/lib/figure/engineering-label'
import { nearestIndex, type TimeWindow } from '@/lib/figure/time-window'

import type { CapturePoints } from './capture-points'

const together = (label: { readonly number: string; readonly unit: string }): string =>
  [label.number, label.unit].filter(Boolean).join('\u00a0')

/** "12.40 ns"; five digits, as the two cursors may stand close together far from zero. */
export const instantText = (seconds: number): string => together(engineeringLabel(seconds, 's', 5))

/** The level at an instant: one value, or the two ends of the band where many samples share a column. */
export const levelText = (points: CapturePoints, seconds: number, unit: string): string => {
  if (isOutside(points, seconds)) return 'outside the view'
  const index = nearestIndex(points.x, seconds)
  const low = points.min[index]
  const high = points.max[index]
  if (low === undefined || high === undefined) return '–'
  const lowText = together(engineeringLabel(low, unit, 4))
  return low === high ? lowText : `${lowText} to ${together(engineeringLabel(high, unit, 4))}`
}

/** The level at B less that at A, each in the middle of its band. */
export const levelDifferenceText = (
  points: CapturePoints,
  { from, to }: TimeWindow,
  unit: string,
): string => {
  if (isOutside(points, from) || isOutside(points, to)) return '–'
  const [atFrom, atTo] = [middleAt(points, from), middleAt(points, to)]
  return atFrom === null || atTo === null ? '–' : together(engineeringLabel(atTo - atFrom, unit, 4))
}

/** Finer points are fetched for what is in view; a cursor beside it has no level. */
function isOutside({ x }: CapturePoints, seconds: number): boolean {
  const column = x.length > 1 ? ((x.at(-1) ?? 0) - (x[0] ?? 0)) / (x.length - 1) : 0
  return seconds < (x[0] ?? 0) - column || seconds > (x.at(-1) ?? 0) + column
}

function middleAt(points: CapturePoints, seconds: number): number | null {
  const index = nearestIndex(points.x, seconds)
  const low = points.min[index]
  const high = points.max[index]
  return low === undefined || high === undefined ? null : (low + high) / 2
}

export const differenceText = (cursors: TimeWindow): string =>
  instantText(Math.abs(cursors.to - cursors.from))

/** The frequency whose period is the distance between the cursors. */
export const frequencyText = (cursors: TimeWindow): string => {
  const distance = Math.abs(cursors.to - cursors.from)
  return distance > 0 ? together(engineeringLabel(1 / distance, 'Hz', 4)) : '–'
}
