'use client'

import { useQuery } from '@tanstack/react-query'

import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { PageBody } from '../shell/page-body'
import { LinkButton } from '../ui/link-button'
import { Sheet } from '../ui/sheet'
import { fetchPurchase, type PurchaseAnswer } from './purchase-answer'
import { PurchaseFacts } from './purchase-facts'
import { PurchaseOutcome } from './purchase-outcome'

type PurchaseProgressProps = { readonly initial: PurchaseAnswer; readonly begin: FormAction }

const isUndecided = (purchase: PurchaseAnswer): boolean =>
  purchase.standing === 'open' || purchase.standing === 'arriving'

/** Every second for the first minute, then less often: a bank debit takes days. */
const pauseAfter = (answers: number): number => (answers < 60 ? 1_000 : 15_000)

/** Asks how the purchase stands until it is decided. It shows and never decides. */
export const PurchaseProgress = ({ initial, begin }: PurchaseProgressProps) => {
  const { data: purchase, isRefetchError } = useQuery({
    queryKey: ['purchase', initial.purchaseId],
    queryFn: () => fetchPurchase(initial.purchaseId),
    initialData: initial,
    refetchInterval: ({ state }) =>
      state.data && isUndecided(state.data) ? pauseAfter(state.dataUpdateCount) : false,
  })
  const { companyId, offerId, standing } = purchase
  const isLost = standing === 'failed' || standing === 'expired'
  return (
    <PageBody
      aside={
        <Sheet title="What was ordered">
          <PurchaseFacts purchase={purchase} />
        </Sheet>
      }
    >
      <PurchaseOutcome purchase={purchase} isSilent={isRefetchError} />
      {standing === 'not_begun' ? (
        <ActionForm
          action={begin}
          hidden={{ companyId, offerId }}
          submitLabel="Go to the payment page"
          pendingLabel="Opening the payment page…"
          label="Payment"
        />
      ) : null}
      <div className="flex flex-wrap gap-3">
        {isLost ? (
          <LinkButton tone="primary" href={`/companies/${companyId}/hours/buy`}>
            Try again
          </LinkButton>
        ) : null}
        {standing === 'not_begun' ? null : (
          <LinkButton tone={standing === 'paid' ? 'primary' : 'plain'} href={`/companies/${companyId}/hours`}>
            To your hours
          </LinkButton>
        )}
      </div>
    </PageBody>
  )
}
