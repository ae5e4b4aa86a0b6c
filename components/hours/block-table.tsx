import { DataTable } from '../ui/data-table'
import { StatusMark } from '../ui/status-mark'
import { Timestamp } from '../ui/timestamp'
import { LedgerMinutes } from './ledger-minutes'

type Block = {
  readonly blockId: string
  readonly title: string
  readonly minutes: number
  readonly remaining: number
  readonly validUntil: number
  readonly isExpired: boolean
}

const standing = (block: Block) => {
  if (block.remaining === 0) return <StatusMark kind="closed">Used up</StatusMark>
  return block.isExpired ? (
    <StatusMark kind="attention">Expired</StatusMark>
  ) : (
    <StatusMark kind="active">Valid</StatusMark>
  )
}

/** Bought blocks with what is left of each. */
export const BlockTable = ({ blocks }: { readonly blocks: readonly Block[] }) => (
  <DataTable
    caption="Blocks of hours"
    captionHidden
    rows={blocks}
    rowKey={(block) => block.blockId}
    columns={[
      {
        key: 'title',
        header: 'Block',
        cell: (block) => <span className="block min-w-24">{block.title}</span>,
        isRowHeader: true,
      },
      {
        key: 'bought',
        header: 'Bought',
        align: 'end',
        cell: (block) => <LedgerMinutes minutes={block.minutes} />,
      },
      {
        key: 'left',
        header: 'Left',
        align: 'end',
        cell: (block) => <LedgerMinutes minutes={block.remaining} />,
      },
      {
        key: 'until',
        header: 'Valid until',
        cell: (block) => <Timestamp instant={block.validUntil} dayOnly />,
      },
      { key: 'state', header: 'State', cell: standing },
    ]}
  />
)
