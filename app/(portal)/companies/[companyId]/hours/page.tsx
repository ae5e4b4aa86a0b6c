import type { Metadata } from 'next'

import { ReceiptTable } from '@/components/billing/receipt-table'
import { BlockTable } from '@/components/hours/block-table'
import { LedgerTable } from '@/components/hours/ledger-table'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Minutes, minutesInWords } from '@/components/ui/minutes'
import { Sheet } from '@/components/ui/sheet'
import { balances, purchases } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Hours' }

export default async function HoursPage({ params }: PageProps<'/companies/[companyId]/hours'>) {
  const { companyId } = await params
  const hours = await query(balances.companyHours, { companyId })
  const bought = hours.may.readPurchases ? await query(purchases.companyPurchases, { companyId }) : []
  const lapsed = hours.balanceMinutes - hours.spendableMinutes
  const buy = hours.may.buy ? (
    <LinkButton tone="primary" href={`/companies/${companyId}/hours/buy`}>
      Buy hours
    </LinkButton>
  ) : undefined
  return (
    <>
      <PageHeader
        title="Hours"
        lead={hours.companyName}
        meta={
          <>
            <span className="text-base">
              <Minutes minutes={hours.spendableMinutes} /> can be spent now
            </span>
            {lapsed > 0 ? <span>{minutesInWords(lapsed)} lie in blocks that have expired</span> : null}
          </>
        }
        actions={hours.blocks.length > 0 ? buy : undefined}
      />
      <PageBody>
        {hours.blocks.length === 0 ? (
          <EmptyState title="No hours yet" action={buy}>
            {hours.may.buy
              ? 'Buy a block of hours; consultants begin as soon as a scope is approved.'
              : 'The purchaser of the company buys hours here.'}
          </EmptyState>
        ) : (
          <>
            <Sheet title="Blocks" flush>
              <BlockTable blocks={hours.blocks} />
            </Sheet>
            <Sheet title="Movements" flush>
              <LedgerTable movements={hours.movements} />
            </Sheet>
          </>
        )}
        {bought.length > 0 ? (
          <Sheet title="Purchases" flush>
            <ReceiptTable purchases={bought} />
          </Sheet>
        ) : null}
      </PageBody>
    </>
  )
}
