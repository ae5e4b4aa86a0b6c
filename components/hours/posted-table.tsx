import { DataTable } from '../ui/data-table'
import { Timestamp } from '../ui/timestamp'
import { LedgerMinutes } from './ledger-minutes'
import { workKindLabel } from './work-kinds'

type Posted = {
  readonly timeEntryId: string
  readonly by: string
  readonly workKind: string
  readonly text: string
  readonly startedAt: number
  readonly minutes: number
}

type PostedTableProps = { readonly posted: readonly Posted[]; readonly postedMinutes: number }

/** Time that was debited, as the client sees it. */
export const PostedTable = ({ posted, postedMinutes }: PostedTableProps) => (
  <DataTable
    caption="Posted time"
    captionHidden
    rows={posted}
    rowKey={(entry) => entry.timeEntryId}
    columns={[
      { key: 'when', header: 'Worked', cell: (entry) => <Timestamp instant={entry.startedAt} dayOnly /> },
      {
        key: 'text',
        header: 'What',
        isRowHeader: true,
        cell: (entry) => (
          <span className="block min-w-40 [overflow-wrap:anywhere]">
            {entry.text}
            <span className="block text-sm font-normal text-ink-soft">
              {workKindLabel(entry.workKind)}, {entry.by}
            </span>
          </span>
        ),
      },
      {
        key: 'minutes',
        header: 'Posted',
        align: 'end',
        cell: (entry) => <LedgerMinutes minutes={entry.minutes} />,
      },
    ]}
    footer={['Sum', '', <LedgerMinutes key="sum" minutes={postedMinutes} />]}
  />
)
