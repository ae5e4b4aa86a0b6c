import { offersFor, startCheckout } from '@/lib/domain/billing/checkout.service'
import { companyHours } from '@/lib/domain/hours/balance.service'

import type { DemoPersonKey } from './people'
import type { DemoScene } from './scene'

/** Buys the smallest block on the payment page of the local stand-in, and waits until its event has credited it. */
export async function buyHours(scene: DemoScene, buyer: DemoPersonKey, companyId: string): Promise<void> {
  const [offer] = await scene.as(buyer, offersFor, { companyId })
  if (!offer) throw new Error('The demo catalogue is empty')
  const { url } = await scene.as(buyer, startCheckout, { companyId, offerId: offer.offerId })
  const paid = await fetch(url, {
    method: 'POST',
    headers: { 'content-type': 'application/x-www-form-urlencoded' },
    body: 'with=accepted',
    redirect: 'manual',
  })
  if (paid.status >= 400) throw new Error(`The payments stand-in answered ${paid.status}`)
  for (let attempt = 0; attempt < 120; attempt += 1) {
    const hours = await scene.as(buyer, companyHours, { companyId })
    if (hours.balanceMinutes > 0) return
    await new Promise((resolve) => setTimeout(resolve, 250))
  }
  throw new Error('The demo hours were not credited within 30 s')
}
