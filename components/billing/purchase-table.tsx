import type { ReactNode } from 'react'

import { LedgerMinutes } from '../hours/ledger-minutes'
import { DataTable, type Column } from '../ui/data-table'
import { DecimalCell } from '../ui/decimal-cell'
import { moneyDigits } from '../ui/money'
import { dayInWords } from '../ui/timestamp'
import { CheckList, type Check } from './check-list'
import { PurchaseState, type PurchaseStatus } from './purchase-state'

export type PurchaseLine = {
  readonly purchaseId: string
  readonly companyName: string
  readonly title: string
  readonly status: PurchaseStatus
  readonly receiptNumber: number | null
  readonly createdAt: number
  readonly paidAt: number | null
  readonly currency: string
  readonly grossCents: number | null
  readonly feeCents: number | null
  readonly netCents: number | null
  readonly creditedMinutes: number
  readonly debitedMinutes: number
  readonly remainingMinutes: number
  readonly checks: readonly Check[]
}

type Sums = Pick<PurchaseLine, 'currency' | 'creditedMinutes' | 'debitedMinutes' | 'remainingMinutes'> & {
  readonly grossCents: number
  readonly feeCents: number
  readonly netCents: number
}

type PurchaseTableProps = { readonly purchases: readonly PurchaseLine[]; readonly totals: readonly Sums[] }

const moneyColumn = (header: string, key: 'grossCents' | 'feeCents' | 'netCents'): Column<PurchaseLine> => ({
  key,
  header,
  kind: 'number',
  value: (line) => {
    const amount = line[key]
    return amount === null ? null : { number: moneyDigits(amount), unit: line.currency }
  },
})

const minutesColumn = (
  header: string,
  key: 'creditedMinutes' | 'debitedMinutes' | 'remainingMinutes',
): Column<PurchaseLine> => ({
  key,
  header,
  align: 'end',
  cell: (line) => <LedgerMinutes minutes={line[key]} />,
})

const columns: readonly Column<PurchaseLine>[] = [
  {
    key: 'purchase',
    header: 'Purchase',
    isRowHeader: true,
    cell: (line) => (
      <span className="block min-w-44">
        {line.companyName}
        <span className="block text-sm font-normal text-ink-soft">{line.title}</span>
        <span className="block text-sm font-normal text-ink-soft">
          {line.receiptNumber === null ? 'No receipt' : `Receipt ${line.receiptNumber}`},{' '}
          {dayInWords(line.paidAt ?? line.createdAt)}
        </span>
      </span>
    ),
  },
  moneyColumn('Paid', 'grossCents'),
  moneyColumn('Fee', 'feeCents'),
  moneyColumn('Net', 'netCents'),
  minutesColumn('Credited', 'creditedMinutes'),
  minutesColumn('Debited', 'debitedMinutes'),
  minutesColumn('Left', 'remainingMinutes'),
  {
    key: 'checks',
    header: 'Checks',
    cell: (line) => (
      <>
        {line.status === 'paid' ? null : <PurchaseState status={line.status} />}
        <CheckList checks={line.checks} />
      </>
    ),
  },
]

/** Set like the amounts above it, so that the decimals line up. */
const Sum = ({ cents, currency }: { readonly cents: number; readonly currency: string }) => (
  <DecimalCell figures={{ number: moneyDigits(cents), unit: currency }} fit={{ tail: 3, unit: 3 }} />
)

/** Each purchase with its money and its hours side by side, and their sums. */
export const PurchaseTable = ({ purchases, totals }: PurchaseTableProps) => {
  const stacked = (cell: (sums: Sums) => ReactNode) =>
    totals.map((sums) => (
      <span key={sums.currency} className="block">
        {cell(sums)}
      </span>
    ))
  return (
    <DataTable
      caption="Purchases, newest first"
      captionHidden
      rows={purchases}
      rowKey={(line) => line.purchaseId}
      columns={columns}
      footer={[
        'Sum',
        stacked((sums) => <Sum cents={sums.grossCents} currency={sums.currency} />),
        stacked((sums) => <Sum cents={sums.feeCents} currency={sums.currency} />),
        stacked((sums) => <Sum cents={sums.netCents} currency={sums.currency} />),
        stacked((sums) => <LedgerMinutes minutes={sums.creditedMinutes} />),
        stacked((sums) => <LedgerMinutes minutes={sums.debitedMinutes} />),
        stacked((sums) => <LedgerMinutes minutes={sums.remainingMinutes} />),
        '',
      ]}
    />
  )
}
