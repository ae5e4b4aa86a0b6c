import type { Metadata } from 'next'

import { OfferList } from '@/components/billing/offer-list'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { EmptyState } from '@/components/ui/empty-state'
import { checkouts } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { startCheckout } from './actions'

export const metadata: Metadata = { title: 'Buy hours' }

export default async function BuyHoursPage({ params }: PageProps<'/companies/[companyId]/hours/buy'>) {
  const { companyId } = await params
  const offers = await query(checkouts.offersFor, { companyId })
  return (
    <>
      <PageHeader
        title="Buy hours"
        crumbs={[{ label: 'Hours', href: `/companies/${companyId}/hours` }, { label: 'Buy' }]}
        lead="You pay on the page of the payment provider. The hours are there as soon as the provider has told us of the payment; a receipt follows by e-mail."
      />
      <PageBody>
        {offers.length === 0 ? (
          <EmptyState title="Nothing on sale just now">
            Write to the practice; it publishes its blocks here.
          </EmptyState>
        ) : (
          <OfferList companyId={companyId} offers={offers} buy={startCheckout} />
        )}
      </PageBody>
    </>
  )
}
