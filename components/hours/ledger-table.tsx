import { DataTable } from '../ui/data-table'
import { Minutes } from '../ui/minutes'
import { Timestamp } from '../ui/timestamp'
import { ledgerKindLabel } from './ledger-kinds'

type Movement = {
  readonly entryId: string
  readonly at: number
  readonly kind: string
  readonly text: string
  readonly engagement: string | null
  readonly minutes: number
  readonly balance: number
}

/** Every movement of hours, newest first, with the balance after it. */
export const LedgerTable = ({ movements }: { readonly movements: readonly Movement[] }) => (
  <DataTable
    caption="Movements of hours"
    captionHidden
    rows={movements}
    rowKey={(movement) => movement.entryId}
    columns={[
      { key: 'at', header: 'When', cell: (movement) => <Timestamp instant={movement.at} /> },
      {
        key: 'text',
        header: 'What',
        isRowHeader: true,
        cell: (movement) => (
          <>
            {movement.text}
            {movement.engagement ? (
              <span className="block text-sm font-normal text-ink-soft">{movement.engagement}</span>
            ) : null}
          </>
        ),
      },
      { key: 'kind', header: 'Kind', cell: (movement) => ledgerKindLabel(movement.kind) },
      {
        key: 'minutes',
        header: 'Hours',
        align: 'end',
        cell: (movement) => <Minutes minutes={movement.minutes} />,
      },
      {
        key: 'balance',
        header: 'Balance',
        align: 'end',
        cell: (movement) => <Minutes minutes={movement.balance} />,
      },
    ]}
  />
)
