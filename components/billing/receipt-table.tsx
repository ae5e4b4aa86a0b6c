import { LedgerMinutes } from '../hours/ledger-minutes'
import { DataTable } from '../ui/data-table'
import { moneyDigits } from '../ui/money'
import { TextLink } from '../ui/text-link'
import { Timestamp } from '../ui/timestamp'
import { PurchaseState, type PurchaseStatus } from './purchase-state'

type Purchase = {
  readonly purchaseId: string
  readonly title: string
  readonly minutes: number
  readonly grossCents: number
  readonly currency: string
  readonly status: PurchaseStatus
  readonly receiptNumber: number | null
  readonly paidAt: number | null
}

/** What the company bought, by receipt. */
export const ReceiptTable = ({ purchases }: { readonly purchases: readonly Purchase[] }) => (
  <DataTable
    caption="Purchases, newest first"
    captionHidden
    rows={purchases}
    rowKey={(purchase) => purchase.purchaseId}
    columns={[
      {
        key: 'receipt',
        header: 'Receipt',
        align: 'end',
        cell: (purchase) => <span className="num">{purchase.receiptNumber}</span>,
      },
      {
        key: 'title',
        header: 'Block',
        isRowHeader: true,
        cell: (purchase) => (
          <span className="block min-w-24">
            <TextLink href={`/purchases/${purchase.purchaseId}`}>{purchase.title}</TextLink>
          </span>
        ),
      },
      {
        key: 'paid',
        header: 'Paid on',
        cell: ({ paidAt }) => (paidAt === null ? '–' : <Timestamp instant={paidAt} dayOnly />),
      },
      {
        key: 'hours',
        header: 'Hours',
        align: 'end',
        cell: (purchase) => <LedgerMinutes minutes={purchase.minutes} />,
      },
      {
        key: 'gross',
        header: 'Paid',
        kind: 'number',
        value: (purchase) => ({ number: moneyDigits(purchase.grossCents), unit: purchase.currency }),
      },
      { key: 'state', header: 'State', cell: (purchase) => <PurchaseState status={purchase.status} /> },
    ]}
  />
)
