import { columnLabels } from '@/lib/figure/engineering-label'
import type { TimeWindow } from '@/lib/figure/time-window'

import { DataTable, type Column } from '../ui/data-table'
import type { Figures } from '../ui/decimal-cell'
import { Disclosure } from '../ui/disclosure'
import type { CapturePoints } from './capture-points'

type CaptureValuesProps = {
  readonly label: string
  readonly unit: string
  readonly points: CapturePoints
  readonly window: TimeWindow
}

const most = 24

/** Evenly chosen columns of what is in view. */
const chosen = (points: CapturePoints, window: TimeWindow): number[] => {
  const inView = points.x.flatMap((x, index) => (x >= window.from && x <= window.to ? [index] : []))
  if (inView.length <= most) return inView
  return Array.from(
    { length: most },
    (_, row) => inView[Math.round((row * (inView.length - 1)) / (most - 1))] ?? 0,
  )
}

type Row = { readonly key: string; readonly x: Figures; readonly min: Figures; readonly max: Figures }

const rowsOf = ({ points, window, unit }: CaptureValuesProps): Row[] => {
  const indices = chosen(points, window)
  const at = (values: readonly number[]) => indices.map((index) => values[index] ?? NaN)
  const instants = columnLabels(at(points.x), 's', 5)
  const levels = columnLabels([...at(points.min), ...at(points.max)], unit)
  const nothing: Figures = { number: '–' }
  return indices.map((index, row) => ({
    key: index.toString(),
    x: instants[row] ?? nothing,
    min: levels[row] ?? nothing,
    max: levels[row + indices.length] ?? nothing,
  }))
}

const columns: Column<Row>[] = [
  { key: 'x', kind: 'number', header: 'Time', value: (row) => row.x },
  { key: 'min', kind: 'number', header: 'Lowest', value: (row) => row.min },
  { key: 'max', kind: 'number', header: 'Highest', value: (row) => row.max },
]

/** The part of the capture in view as a table. */
export const CaptureValues = (props: CaptureValuesProps) => (
  <Disclosure summary={<span className="text-sm">Values of {props.label} in view</span>}>
    <DataTable
      caption={`${props.label}: evenly chosen instants of what is in view`}
      columns={columns}
      rows={rowsOf(props)}
      rowKey={(row) => row.key}
    />
  </Disclosure>
)
