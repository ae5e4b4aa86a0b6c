import { DataTable } from '../ui/data-table'
import { StatusMark } from '../ui/status-mark'
import { Timestamp } from '../ui/timestamp'

type Event = {
  readonly eventId: string
  readonly type: string
  readonly receivedAt: number
  readonly isRefused: boolean
  readonly note: string
}

/** What the payment provider told and nobody has acted on: refused because it does not fit, or settled by hand. */
export const EventTable = ({ events }: { readonly events: readonly Event[] }) => (
  <DataTable
    caption="Events of the payment provider to look at"
    captionHidden
    rows={events}
    rowKey={(event) => event.eventId}
    columns={[
      { key: 'at', header: 'Received', cell: (event) => <Timestamp instant={event.receivedAt} /> },
      {
        key: 'type',
        header: 'Event',
        isRowHeader: true,
        cell: (event) => (
          <>
            <span className="num">{event.type}</span>
            <span className="num block text-xs font-normal text-ink-faint">{event.eventId}</span>
          </>
        ),
      },
      {
        key: 'what',
        header: 'What became of it',
        cell: (event) => (
          <>
            {event.isRefused ? (
              <StatusMark kind="over-limit">Refused</StatusMark>
            ) : (
              <StatusMark kind="attention">To settle by hand</StatusMark>
            )}
            <span className="block text-sm [overflow-wrap:anywhere]">{event.note}</span>
          </>
        ),
      },
    ]}
  />
)
