import type { ReactNode } from 'react'

import { classNames } from './class-names'
import { DecimalCell, fitDecimals, type Figures } from './decimal-cell'

type ColumnBase = {
  readonly key: string
  readonly header: ReactNode
}

export type TextColumn<Row> = ColumnBase & {
  readonly kind?: 'text' | undefined
  readonly cell: (row: Row) => ReactNode
  /** This cell names its row. */
  readonly isRowHeader?: boolean | undefined
  readonly align?: 'start' | 'end' | undefined
}

export type NumberColumn<Row> = ColumnBase & {
  readonly kind: 'number'
  readonly value: (row: Row) => Figures | null
}

export type Column<Row> = TextColumn<Row> | NumberColumn<Row>

type DataTableProps<Row> = {
  /** What the table shows; also the name of its scrolling region. */
  readonly caption: string
  /** The caption is read aloud but not shown, where a heading already says the same. */
  readonly captionHidden?: boolean | undefined
  readonly columns: readonly Column<Row>[]
  readonly rows: readonly Row[]
  readonly rowKey: (row: Row) => string
  /** Instead of the table when there are no rows: say the next step. */
  readonly empty?: ReactNode
  /** A last row, one cell a column, e.g. totals. */
  readonly footer?: readonly ReactNode[] | undefined
}

const padding = 'px-3 py-1.5 first:pl-4 last:pr-4 sm:first:pl-5 sm:last:pr-5'
const isEnd = <Row,>(column: Column<Row>) => column.kind === 'number' || column.align === 'end'

type BodyProps<Row> = Pick<DataTableProps<Row>, 'columns' | 'rows' | 'rowKey'>

const Body = <Row,>({ columns, rows, rowKey }: BodyProps<Row>) => {
  const fits = columns.map((column) => fitDecimals(column.kind === 'number' ? rows.map(column.value) : []))
  return (
    <tbody className="divide-y divide-rule">
      {rows.map((row) => (
        <tr key={rowKey(row)} className="hover:bg-sunk">
          {columns.map((column, index) => {
            const look = classNames(padding, 'align-baseline', isEnd(column) ? 'text-right' : 'text-left')
            if (column.kind === 'number') {
              return (
                <td key={column.key} className={look}>
                  <DecimalCell figures={column.value(row)} fit={fits[index] ?? { tail: 0, unit: 0 }} />
                </td>
              )
            }
            return column.isRowHeader ? (
              <th key={column.key} scope="row" className={classNames(look, 'font-semibold')}>
                {column.cell(row)}
              </th>
            ) : (
              <td key={column.key} className={look}>
                {column.cell(row)}
              </td>
            )
          })}
        </tr>
      ))}
    </tbody>
  )
}

/** A ruled table; on a narrow screen it scrolls inside its own region, which the keyboard reaches. */
export const DataTable = <Row,>({
  columns,
  rows,
  rowKey,
  caption,
  captionHidden,
  empty,
  footer,
}: DataTableProps<Row>) => {
  if (rows.length === 0 && empty) return <>{empty}</>
  return (
    // The region holds what is placed absolutely in it, so that text for screen readers cannot widen the page.
    <div
      role="region"
      aria-label={caption}
      tabIndex={0}
      className="relative overflow-x-auto -outline-offset-2"
    >
      <table className="w-full border-collapse">
        <caption className={captionHidden ? 'sr-only' : 'px-4 py-2 text-left text-sm text-ink-soft sm:px-5'}>
          {caption}
        </caption>
        <thead>
          <tr className="border-b border-rule-strong bg-sunk">
            {columns.map((column) => (
              <th
                key={column.key}
                scope="col"
                className={classNames(
                  padding,
                  'text-sm font-semibold',
                  isEnd(column) ? 'text-right' : 'text-left',
                )}
              >
                {column.header}
              </th>
            ))}
          </tr>
        </thead>
        <Body columns={columns} rows={rows} rowKey={rowKey} />
        {footer ? (
          <tfoot>
            <tr className="border-t-2 border-rule-strong font-semibold">
              {footer.map((cell, index) => {
                const column = columns[index]
                return (
                  <td
                    key={index}
                    className={classNames(padding, column && isEnd(column) ? 'text-right' : 'text-left')}
                  >
                    {cell}
                  </td>
                )
              })}
            </tr>
          </tfoot>
        ) : null}
      </table>
    </div>
  )
}
