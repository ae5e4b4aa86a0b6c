import type { ChoiceTable } from '@/lib/core/method/method'
import { formatQuantity } from '@/lib/core/units/format-quantity'

import { DataTable, type Column } from '../ui/data-table'
import { Sheet } from '../ui/sheet'
import { MathText } from './math-text'

type NumberedRow = { readonly index: number; readonly values: readonly number[] }

export const choiceRows = (table: ChoiceTable): readonly NumberedRow[] =>
  table.rows.map((values, index) => ({ index, values }))

export const choiceColumns = (table: ChoiceTable): readonly Column<NumberedRow>[] =>
  table.columns.map((column, position) => ({
    key: column.label,
    kind: 'number',
    header: <MathText>{column.label}</MathText>,
    value: (row) => formatQuantity(row.values[position] ?? Number.NaN, column.unit, 3),
  }))

/** Alternatives side by side, such as the standard parts that a snubber could be made of. */
export const ChoiceTables = ({ choices }: { readonly choices: readonly ChoiceTable[] }) =>
  choices.map((table) => (
    <Sheet key={table.title} title={table.title} flush>
      <DataTable
        caption={table.title}
        captionHidden
        columns={choiceColumns(table)}
        rows={choiceRows(table)}
        rowKey={(row) => row.index.toString()}
      />
    </Sheet>
  ))
