import { writtenBounds } from '@/lib/core/method/written-bounds'
import type { InputDefinitions } from '@/lib/core/method/input-definition'
import type { RawInput } from '@/lib/core/method/input-definition'

import { MathText, SymbolText } from '../findings/math-text'
import { DataTable } from '../ui/data-table'

type InputTableProps = {
  readonly inputs: InputDefinitions
  /** What the worked example puts in. */
  readonly given: Readonly<Record<string, RawInput>>
}

/** Every input: what it is, what is allowed, and what the worked example has for it. */
export const InputTable = ({ inputs, given }: InputTableProps) => (
  <DataTable
    caption="Inputs"
    captionHidden
    columns={[
      {
        key: 'name',
        header: 'Input',
        isRowHeader: true,
        cell: ([, definition]) => (
          <>
            {definition.label} <SymbolText symbol={definition.symbol} />
            {definition.isRequired ? null : <span className="font-normal text-ink-faint"> (optional)</span>}
          </>
        ),
      },
      {
        key: 'help',
        header: 'Meaning',
        cell: ([, definition]) => (
          <span className="block min-w-56 text-sm">
            <MathText>{definition.help}</MathText>
          </span>
        ),
      },
      {
        key: 'range',
        header: 'Range',
        cell: ([, definition]) => <span className="block min-w-40 text-sm">{writtenBounds(definition)}</span>,
      },
      {
        key: 'example',
        header: 'Example',
        align: 'end',
        cell: ([key]) => <span className="num whitespace-pre-line">{exampleText(given[key])}</span>,
      },
    ]}
    rows={Object.entries(inputs)}
    rowKey={([key]) => key}
  />
)

const exampleText = (given: RawInput | undefined): string => {
  if (given === undefined) return '–'
  return typeof given === 'object'
    ? given.map((row) => Object.values(row).join(', ')).join('\n')
    : String(given)
}
