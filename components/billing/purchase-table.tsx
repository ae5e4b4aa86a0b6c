import { DataTable } from '../ui/data-table'
import { Minutes } from '../ui/minutes'
import { moneyDigits } from '../ui/money'
import { AgreementList } from './agreement-list'

export type PurchaseLine = {
  readonly purchaseId: string
  readonly companyName: string
  readonly title: string
  readonly status: string
  readonly receiptNumber: number | null
  readonly currency: string
  readonly priceCents: number
  readonly grossCents: number | null
  readonly feeCents: number | null
  readonly netCents: number | null
  readonly creditedMinutes: number
  readonly agreements: readonly { readonly agrees: boolean; readonly sentence: string }[]
}

const money = (line: PurchaseLine, cents: number | null) =>
  cents === null ? null : { number: moneyDigits(cents), unit: line.currency }

/** Price, payment, fee, net and credited hours of every purchase, side by side. */
export const PurchaseTable = ({ purchases }: { readonly purchases: readonly PurchaseLine[] }) => (
  <DataTable
    caption="Purchases, payments and credits"
    captionHidden
    rows={purchases}
    rowKey={(line) => line.purchaseId}
    columns={[
      {
        key: 'purchase',
        header: 'Purchase',
        isRowHeader: true,
        cell: (line) => (
          <>
            {line.companyName}
            <span className="block text-sm font-normal text-ink-soft">
              {line.title}, {line.status}
              {line.receiptNumber === null ? '' : `, receipt ${line.receiptNumber}`}
            </span>
          </>
        ),
      },
      { key: 'price', header: 'Price', kind: 'number', value: (line) => money(line, line.priceCents) },
      { key: 'gross', header: 'Paid', kind: 'number', value: (line) => money(line, line.grossCents) },
      { key: 'fee', header: 'Fee', kind: 'number', value: (line) => money(line, line.feeCents) },
      { key: 'net', header: 'Net', kind: 'number', value: (line) => money(line, line.netCents) },
      {
        key: 'credit',
        header: 'Credited',
        align: 'end',
        cell: (line) => <Minutes minutes={line.creditedMinutes} />,
      },
      { key: 'agree', header: 'Agreement', cell: (line) => <AgreementList agreements={line.agreements} /> },
    ]}
  />
)
