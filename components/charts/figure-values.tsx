import type { Figure } from '@/lib/core/figure/figure'
import { valueTables, type ValueRow } from '@/lib/figure/value-table'

import { DataTable, type Column } from '../ui/data-table'
import { Disclosure } from '../ui/disclosure'

const columnsOf = (figure: Figure): Column<ValueRow>[] => [
  { key: 'x', kind: 'number', header: figure.x.label, value: (row) => row.x },
  { key: 'y', kind: 'number', header: figure.y.label, value: (row) => row.y },
  { key: 'note', header: 'Remark', cell: (row) => row.note },
]

/** The figure as numbers, for reading aloud and for anybody who wants the values. */
export const FigureValues = ({ figure }: { readonly figure: Figure }) => (
  <Disclosure summary={<span className="text-sm">Values of this figure</span>}>
    <div className="flex max-w-2xl flex-col gap-4">
      {valueTables(figure).map((table) => (
        <DataTable
          key={table.id}
          caption={
            table.rows.length < table.total
              ? `${table.label}: ${table.rows.length} of ${table.total} points, the highest and the lowest among them`
              : `${table.label}: all ${table.total} points`
          }
          columns={columnsOf(figure)}
          rows={table.rows}
          rowKey={(row) => row.index.toString()}
        />
      ))}
    </div>
  </Disclosure>
)
