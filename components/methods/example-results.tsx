import type { ResultValue } from '@/lib/core/method/method'
import { formatQuantity } from '@/lib/core/units/format-quantity'

import { MathText, SymbolText } from '../findings/math-text'
import { DataTable } from '../ui/data-table'

type ExampleResultsProps = { readonly results: readonly ResultValue[] }

/** What the worked example gives: the answers first, then every value on the way. */
export const ExampleResults = ({ results }: ExampleResultsProps) => (
  <DataTable
    caption="Results of the worked example"
    captionHidden
    columns={[
      {
        key: 'name',
        header: 'Result',
        cell: (result) => (
          <span className={result.role === 'main' ? 'font-semibold' : undefined}>
            <MathText>{result.label}</MathText> <SymbolText symbol={result.symbol} />
          </span>
        ),
      },
      {
        key: 'value',
        kind: 'number',
        header: 'Value',
        value: (result) => formatQuantity(result.value, result.unit),
      },
    ]}
    rows={[...results].sort((one, other) => rank(one) - rank(other))}
    rowKey={(result) => result.key}
  />
)

const rank = ({ role }: ResultValue): number => (role === 'main' ? 0 : 1)
