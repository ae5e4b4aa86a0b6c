import { after } from 'next/server'

import { collectFees } from '@/lib/server/fee-collector'
import { guarded, privateJson, problem } from '@/lib/server/http'
import { paymentEvents } from '@/lib/server/operations'

/**
 * Deliveries of the payment provider. The body is read as it came, because the signature is over its very bytes; an
 * unexpected failure answers 500, so that the event is sent again.
 */
export const POST = (request: Request): Promise<Response> =>
  guarded(async (deps) => {
    const rawBody = await request.text()
    const signature = request.headers.get('stripe-signature')
    const received = await paymentEvents.receiveEvent.execute(deps, { rawBody, signature })
    if (!received.ok) return problem(received.error, deps.request.id)
    after(collectFees)
    return privateJson({ outcome: received.value.outcome })
  })
