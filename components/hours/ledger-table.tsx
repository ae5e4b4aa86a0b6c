import { DataTable } from '../ui/data-table'
import { Timestamp } from '../ui/timestamp'
import { ledgerKindLabel } from './ledger-kinds'
import { LedgerMinutes } from './ledger-minutes'

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
      { key: 'at', header: 'When', cell: (movement) => <Timestamp instant={movement.at} dayOnly /> },
      {
        key: 'text',
        header: 'What',
        isRowHeader: true,
        cell: (movement) => (
          <span className="block min-w-48 [overflow-wrap:anywhere]">
            {movement.text}
            <span className="block text-sm font-normal text-ink-soft">
              {[ledgerKindLabel(movement.kind), movement.engagement].filter(Boolean).join(', ')}
            </span>
          </span>
        ),
      },
      {
        key: 'minutes',
        header: 'Hours',
        align: 'end',
        cell: (movement) => <LedgerMinutes minutes={movement.minutes} />,
      },
      {
        key: 'balance',
        header: 'Balance',
        align: 'end',
        cell: (movement) => <LedgerMinutes minutes={movement.balance} />,
      },
    ]}
  />
)
