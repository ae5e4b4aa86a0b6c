'use client'

import { useQuery } from '@tanstack/react-query'
import { z } from 'zod'

import { LinkButton } from '../ui/link-button'
import { minutesInWords } from '../ui/minutes'
import { Notice } from '../ui/notice'

const statusSchema = z.object({ status: z.enum(['open', 'paid', 'failed', 'expired', 'refunded']) })

type Status = z.infer<typeof statusSchema>['status']

async function fetchStatus(purchaseId: string): Promise<Status> {
  const response = await fetch(`/api/purchases/${purchaseId}`)
  if (!response.ok) throw new Error('not answered')
  return statusSchema.parse(await response.json()).status
}

type PurchaseProgressProps = {
  readonly purchaseId: string
  readonly companyId: string
  readonly minutes: number
  readonly initial: Status
}

/** Asks how the purchase stands until it is decided. It shows and never decides. */
export const PurchaseProgress = ({ purchaseId, companyId, minutes, initial }: PurchaseProgressProps) => {
  const { data: status } = useQuery({
    queryKey: ['purchase', purchaseId],
    queryFn: () => fetchStatus(purchaseId),
    initialData: initial,
    refetchInterval: (current) => (current.state.data === 'open' ? 1_000 : false),
  })
  return (
    <div className="flex flex-col items-start gap-5">
      <Outcome status={status} minutes={minutes} />
      {status === 'open' ? null : (
        <LinkButton tone={status === 'paid' ? 'primary' : 'plain'} href={`/companies/${companyId}/hours`}>
          To your hours
        </LinkButton>
      )}
      {status === 'failed' || status === 'expired' ? (
        <LinkButton tone="primary" href={`/companies/${companyId}/hours/buy`}>
          Try again
        </LinkButton>
      ) : null}
    </div>
  )
}

const Outcome = ({ status, minutes }: { readonly status: Status; readonly minutes: number }) => {
  switch (status) {
    case 'open':
      return (
        <Notice live title="Waiting for the payment provider">
          You can leave this page: the hours are credited as soon as the provider tells us of the payment, and
          the receipt goes out by e-mail.
        </Notice>
      )
    case 'paid':
      return (
        <Notice tone="success" live title={`${minutesInWords(minutes)} are credited`}>
          The receipt is on its way by e-mail.
        </Notice>
      )
    case 'failed':
      return (
        <Notice tone="error" live title="The payment failed">
          Nothing was credited. Try again, perhaps in another way.
        </Notice>
      )
    case 'expired':
      return (
        <Notice tone="error" live title="The payment was not finished in time">
          Nothing was paid and nothing was credited.
        </Notice>
      )
    case 'refunded':
      return <Notice live title="The payment was refunded" />
  }
}
