import { z } from '../shell/plain-zod'

/** How a purchase stands, as the interface tells it. */
export const purchaseAnswer = z.object({
  purchaseId: z.string(),
  companyId: z.string(),
  offerId: z.string(),
  title: z.string(),
  minutes: z.int(),
  standing: z.enum(['not_begun', 'open', 'arriving', 'paid', 'failed', 'expired', 'refunded']),
  netCents: z.int(),
  taxCents: z.int(),
  taxLabel: z.string(),
  grossCents: z.int(),
  currency: z.string(),
  receiptNumber: z.int().nullable(),
  validUntil: z.int().nullable(),
})

export type PurchaseAnswer = z.infer<typeof purchaseAnswer>

export async function fetchPurchase(purchaseId: string): Promise<PurchaseAnswer> {
  const response = await fetch(`/api/purchases/${purchaseId}`)
  if (!response.ok) throw new Error('not answered')
  return purchaseAnswer.parse(await response.json())
}
