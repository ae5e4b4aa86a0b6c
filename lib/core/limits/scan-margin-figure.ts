import type { Figure } from '../figure/figure'
import { quantityText } from '../units/format-quantity'
import { limitTitle } from './limit-tables'
import type { LimitTable } from './limit-table'
import type { PointMargin } from './scan-margin'

/** The scan as points joined by rising frequency, and the limit as one line a segment, named on the line. */
export function scanMarginFigure(
  table: LimitTable,
  margins: readonly PointMargin[],
  worst: PointMargin,
): Figure {
  const points = margins.toSorted((a, b) => a.frequency - b.frequency)
  const title = limitTitle(table)
  return {
    id: 'scan-margin',
    title: 'Scan against the limit',
    description: `${title}: smallest margin ${quantityText(worst.margin, 'dB', 3)} at ${quantityText(worst.frequency, 'Hz')}.`,
    x: { label: 'Frequency', unit: 'Hz', scale: 'log' },
    y: { label: 'Level', unit: table.unit, scale: 'linear' },
    series: [
      ...table.segments.map(({ from, to, startLevel, endLevel }, index) => ({
        id: `limit-${index}`,
        label: index === 0 ? title : '',
        role: 'limit' as const,
        x: [from, to],
        y: [startLevel, endLevel],
      })),
      {
        id: 'scan',
        label: 'Scan',
        role: 'measured',
        x: points.map(({ frequency }) => frequency),
        y: points.map(({ level }) => level),
      },
    ],
    marks: [
      {
        kind: 'point',
        x: worst.frequency,
        y: worst.level,
        label: quantityText(worst.margin, 'dB', 3),
      },
    ],
  }
}
