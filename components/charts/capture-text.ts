import { engineeringLabel } from '@/lib/figure/engineering-label'
import { nearestIndex, type TimeWindow } from '@/lib/figure/time-window'

import type { CapturePoints } from './capture-points'

const together = (label: { readonly number: string; readonly unit: string }): string =>
  [label.number, label.unit].filter(Boolean).join('\u00a0')

/** "12.40 ns"; five digits, as the two cursors may stand close together far from zero. */
export const instantText = (seconds: number): string => together(engineeringLabel(seconds, 's', 5))

/** The level at an instant: one value, or the two ends of the band where many samples share a column. */
export const levelText = (points: CapturePoints, seconds: number, unit: string): string => {
  const index = nearestIndex(points.x, seconds)
  const low = points.min[index]
  const high = points.max[index]
  if (low === undefined || high === undefined) return '–'
  const lowText = together(engineeringLabel(low, unit, 4))
  return low === high ? lowText : `${lowText} to ${together(engineeringLabel(high, unit, 4))}`
}

export const differenceText = (cursors: TimeWindow): string =>
  instantText(Math.abs(cursors.to - cursors.from))

/** The frequency whose period is the distance between the cursors. */
export const frequencyText = (cursors: TimeWindow): string => {
  const distance = Math.abs(cursors.to - cursors.from)
  return distance > 0 ? together(engineeringLabel(1 / distance, 'Hz', 4)) : '–'
}
