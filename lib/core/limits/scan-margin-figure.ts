import type { Figure, Series } from '../figure/figure'
import { quantityText } from '../units/format-quantity'
import { limitTitle } from './limit-tables'
import type { LimitSegment, LimitTable } from './limit-table'
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
      ...limitLines(table.segments).map((line, index) => limitSeries(line, title, index)),
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

/** Segments that join, as one line with a step at each transition. */
function limitLines(segments: readonly LimitSegment[]): readonly (readonly LimitSegment[])[] {
  const lines: LimitSegment[][] = []
  for (const segment of segments) {
    const last = lines.at(-1)
    if (last?.at(-1)?.to === segment.from) last.push(segment)
    else lines.push([segment])
  }
  return lines
}

const limitSeries = (line: readonly LimitSegment[], title: string, index: number): Series => ({
  id: `limit-${index}`,
  label: index === 0 ? title : `${title}, from ${quantityText(line[0]?.from ?? 0, 'Hz', 3)}`,
  role: 'limit',
  x: line.flatMap(({ from, to }) => [from, to]),
  y: line.flatMap(({ startLevel, endLevel }) => [startLevel, endLevel]),
})
