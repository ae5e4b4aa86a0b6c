import type { Metadata } from 'next'

import { PurchaseProgress } from '@/components/billing/purchase-progress'
import { PageHeader } from '@/components/shell/page-header'
import { purchases } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { startCheckout } from '../../companies/[companyId]/hours/buy/actions'

export const metadata: Metadata = { title: 'Your purchase' }

export default async function PurchasePage({ params }: PageProps<'/purchases/[purchaseId]'>) {
  const { purchaseId } = await params
  const purchase = await query(purchases.purchaseStatus, { purchaseId })
  return (
    <>
      <PageHeader
        title="Your purchase"
        crumbs={[{ label: 'Hours', href: `/companies/${purchase.companyId}/hours` }, { label: 'Purchase' }]}
      />
      <PurchaseProgress initial={purchase} begin={startCheckout} />
    </>
  )
}
