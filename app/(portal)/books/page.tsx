import type { Metadata } from 'next'

import { AccountTable } from '@/components/billing/account-table'
import { BooksState } from '@/components/billing/books-state'
import { CatalogueTable } from '@/components/billing/catalogue-table'
import { CheckList } from '@/components/billing/check-list'
import { EventTable } from '@/components/billing/event-table'
import { PurchaseTable } from '@/components/billing/purchase-table'
import { UnpaidTable } from '@/components/billing/unpaid-table'
import { ActionForm } from '@/components/forms/action-form'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { Disclosure } from '@/components/ui/disclosure'
import { EmptyState } from '@/components/ui/empty-state'
import { Sheet } from '@/components/ui/sheet'
import { books } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { fetchFees } from './actions'

export const metadata: Metadata = { title: 'Books' }

export default async function BooksPage() {
  const [overview, offers] = await Promise.all([query(books.booksOverview), query(books.catalogue)])
  const { accounts, events, totals } = overview
  const checks = [...overview.purchases, ...accounts].flatMap((line) => line.checks).concat(overview.checks)
  const isMoved = (line: (typeof overview.purchases)[number]) =>
    line.grossCents !== null ||
    line.status === 'paid' ||
    line.checks.some((check) => check.state === 'differs')
  const moved = overview.purchases.filter(isMoved)
  const unpaid = overview.purchases.filter((line) => !isMoved(line))
  const askForFees = checks.some((check) => check.state === 'pending') ? (
    <ActionForm
      action={fetchFees}
      submitLabel="Ask for the fees now"
      pendingLabel="Asking…"
      tone="plain"
      size="small"
      label="Fees of the payment provider"
    />
  ) : undefined
  return (
    <>
      <PageHeader
        title="Books"
        lead="What was paid, what the provider kept, the hours that were credited, and the time that was posted, side by side."
        meta={<BooksState checks={checks} />}
      />
      <PageBody>
        {events.length > 0 ? (
          <Sheet title="To look at: events of the payment provider" flush>
            <EventTable events={events} />
          </Sheet>
        ) : null}
        <Sheet title="Purchases" flush={moved.length > 0} actions={askForFees}>
          {moved.length === 0 ? (
            <EmptyState title="No payment yet">
              It appears here with its fee and its hours as soon as a client has paid.
            </EmptyState>
          ) : (
            <>
              <PurchaseTable purchases={moved} totals={totals} />
              <div className="border-t border-rule px-4 py-2.5 sm:px-5">
                <CheckList checks={overview.checks} isExplained />
              </div>
            </>
          )}
        </Sheet>
        {unpaid.length > 0 ? (
          <Sheet>
            <Disclosure summary={`Begun and not paid (${unpaid.length})`}>
              <UnpaidTable purchases={unpaid} />
            </Disclosure>
          </Sheet>
        ) : null}
        <Sheet title="Catalogue" flush={offers.length > 0}>
          {offers.length === 0 ? (
            <EmptyState title="Nothing in the catalogue">
              Clients can buy hours once it holds a block.
            </EmptyState>
          ) : (
            <CatalogueTable offers={offers} />
          )}
        </Sheet>
        <Sheet title="Hours of the clients" flush>
          <AccountTable accounts={accounts} />
        </Sheet>
      </PageBody>
    </>
  )
}
