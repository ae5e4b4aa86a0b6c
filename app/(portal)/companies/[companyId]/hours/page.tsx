import type { Metadata } from 'next'

import { BlockTable } from '@/components/hours/block-table'
import { LedgerTable } from '@/components/hours/ledger-table'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Minutes } from '@/components/ui/minutes'
import { Sheet } from '@/components/ui/sheet'
import { balances } from '@/lib/server/operations'
import { query } from '@/lib/server/query'
import { requireActor } from '@/lib/server/session'

export const metadata: Metadata = { title: 'Hours' }

export default async function HoursPage({ params }: PageProps<'/companies/[companyId]/hours'>) {
  const { companyId } = await params
  const [hours, actor] = await Promise.all([query(balances.companyHours, { companyId }), requireActor()])
  const isPurchaser = actor.memberships.some(
    (membership) => membership.companyId === companyId && membership.role === 'purchaser',
  )
  const buy = isPurchaser ? (
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
          <span className="text-base">
            <Minutes minutes={hours.spendableMinutes} /> can be spent now
          </span>
        }
        actions={buy}
      />
      <PageBody>
        {hours.blocks.length === 0 ? (
          <EmptyState title="No hours yet" action={buy}>
            {isPurchaser
              ? 'Buy a block of hours; consultants begin as soon as a scope is approved.'
              : 'The purchaser of your company buys hours here.'}
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
      </PageBody>
    </>
  )
}
