import type { Metadata } from 'next'

import { PurchaseProgress } from '@/components/billing/purchase-progress'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { DescriptionList } from '@/components/ui/description-list'
import { Minutes } from '@/components/ui/minutes'
import { Money } from '@/components/ui/money'
import { Sheet } from '@/components/ui/sheet'
import { checkouts } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Your purchase' }

export default async function PurchasePage({ params }: PageProps<'/purchases/[purchaseId]'>) {
  const { purchaseId } = await params
  const purchase = await query(checkouts.purchaseStatus, { purchaseId })
  return (
    <>
      <PageHeader title="Your purchase" />
      <PageBody>
        <PurchaseProgress
          purchaseId={purchaseId}
          companyId={purchase.companyId}
          minutes={purchase.minutes}
          initial={purchase.status}
        />
        <Sheet>
          <DescriptionList
            items={[
              { term: 'Block', detail: purchase.title },
              { term: 'Hours', detail: <Minutes minutes={purchase.minutes} /> },
              { term: 'Price', detail: <Money cents={purchase.grossCents} currency={purchase.currency} /> },
            ]}
          />
        </Sheet>
      </PageBody>
    </>
  )
}
