import { DataTable } from '../ui/data-table'
import { Minutes } from '../ui/minutes'
import { Timestamp } from '../ui/timestamp'
import { workKindLabel } from './work-kinds'

type Posted = {
  readonly timeEntryId: string
  readonly by: string
  readonly workKind: string
  readonly text: string
  readonly startedAt: number
  readonly minutes: number
}

/** Time that was debited, as the client sees it. */
export const PostedTable = ({ posted }: { readonly posted: readonly Posted[] }) => (
  <DataTable
    caption="Posted time"
    captionHidden
    rows={posted}
    rowKey={(entry) => entry.timeEntryId}
    columns={[
      { key: 'when', header: 'Worked', cell: (entry) => <Timestamp instant={entry.startedAt} /> },
      { key: 'by', header: 'By', cell: (entry) => entry.by },
      { key: 'kind', header: 'Kind', cell: (entry) => workKindLabel(entry.workKind) },
      { key: 'text', header: 'What', cell: (entry) => entry.text, isRowHeader: true },
      {
        key: 'minutes',
        header: 'Posted',
        align: 'end',
        cell: (entry) => <Minutes minutes={entry.minutes} />,
      },
    ]}
  />
)
