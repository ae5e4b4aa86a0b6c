import { DataTable } from '../ui/data-table'
import { Timestamp } from '../ui/timestamp'
import { PurchaseState } from './purchase-state'
import type { PurchaseLine } from './purchase-table'

/** Purchases that were begun and not paid: nothing moved for them. */
export const UnpaidTable = ({ purchases }: { readonly purchases: readonly PurchaseLine[] }) => (
  <DataTable
    caption="Begun and not paid, newest first"
    captionHidden
    rows={purchases}
    rowKey={(line) => line.purchaseId}
    columns={[
      { key: 'begun', header: 'Begun', cell: (line) => <Timestamp instant={line.createdAt} /> },
      { key: 'company', header: 'Client', cell: (line) => line.companyName },
      { key: 'title', header: 'Block', cell: (line) => line.title, isRowHeader: true },
      { key: 'state', header: 'State', cell: (line) => <PurchaseState status={line.status} /> },
    ]}
  />
)
