import type { ChoiceTable } from '@/lib/core/method/method'
import { formatQuantity } from '@/lib/core/units/format-quantity'
import type { Unit } from '@/lib/core/units/unit'

import { DataTable, type Column } from '../ui/data-table'
import { Sheet } from '../ui/sheet'
import { MathText } from './math-text'

type NumberedRow = { readonly index: number; readonly values: readonly (number | string)[] }

export const choiceRows = (table: ChoiceTable): readonly NumberedRow[] =>
  table.rows.map((values, index) => ({ index, values }))

export const choiceColumns = (table: ChoiceTable): readonly Column<NumberedRow>[] =>
  table.columns.map(({ label, unit }, position) => {
    const heading = { key: label, header: <MathText>{label}</MathText> }
    return unit === 'text'
      ? { ...heading, cell: (row) => String(row.values[position] ?? '') }
      : {
          ...heading,
          kind: 'number',
          value: (row) => formatQuantity(Number(row.values[position] ?? Number.NaN), unit, digits(unit)),
        }
  })

/** A frequency tells sources apart by its digits; of most other values three say enough. */
const digits = (unit: Unit): number => (unit === 'Hz' ? 6 : 3)

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
