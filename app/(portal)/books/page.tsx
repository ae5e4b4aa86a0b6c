import type { Metadata } from 'next'

import { AccountTable } from '@/components/billing/account-table'
import { PurchaseTable } from '@/components/billing/purchase-table'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { EmptyState } from '@/components/ui/empty-state'
import { Notice } from '@/components/ui/notice'
import { Sheet } from '@/components/ui/sheet'
import { StatusMark } from '@/components/ui/status-mark'
import { books } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Books' }

export default async function BooksPage() {
  const { purchases, accounts } = await query(books.booksOverview)
  const lines = [...purchases, ...accounts]
  const differing = lines.flatMap((line) => line.agreements).filter((agreement) => !agreement.agrees)
  return (
    <>
      <PageHeader
        title="Books"
        lead="Payments, fees, credited hours and posted time side by side."
        meta={
          differing.length === 0 ? (
            <StatusMark kind="verified">All books agree</StatusMark>
          ) : (
            <StatusMark kind="over-limit">{`${differing.length} to look at`}</StatusMark>
          )
        }
      />
      <PageBody>
        {differing.length > 0 ? (
          <Notice tone="caution" title="Some books do not agree">
            Each difference is named in its row below.
          </Notice>
        ) : null}
        <Sheet title="Purchases" flush={purchases.length > 0}>
          {purchases.length === 0 ? (
            <EmptyState title="No purchase yet">
              It appears here when a client opens the payment page.
            </EmptyState>
          ) : (
            <PurchaseTable purchases={purchases} />
          )}
        </Sheet>
        <Sheet title="Hours of the clients" flush>
          <AccountTable accounts={accounts} />
        </Sheet>
      </PageBody>
    </>
  )
}
