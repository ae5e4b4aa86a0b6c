import Stripe from 'stripe'
import type { z } from 'zod'

import { err, ok, type Result } from '@/lib/core/result'
import type { PaymentsError } from '@/lib/ports/payments'

/** Makes one call of the SDK and reads its answer into our type; every way it can fail becomes a typed error. */
export async function askStripe<T>(
  schema: z.ZodType<T>,
  call: () => Promise<unknown>,
): Promise<Result<T, PaymentsError>> {
  let reply: unknown
  try {
    reply = await call()
  } catch (error) {
    return err(error instanceof Stripe.errors.StripeError ? refusalOf(error) : unexpectedReply)
  }
  const parsed = schema.safeParse(reply)
  return parsed.success ? ok(parsed.data) : err(unexpectedReply)
}

const unexpectedReply: PaymentsError = {
  code: 'unexpected_reply',
  message:
    'The payment provider sent an answer that cannot be read. Nothing was changed here; try again later.',
}

function refusalOf(error: Stripe.errors.StripeError): PaymentsError {
  if (
    error instanceof Stripe.errors.StripeConnectionError ||
    error instanceof Stripe.errors.StripeRateLimitError ||
    error instanceof Stripe.errors.StripeAPIError
  ) {
    return {
      code: 'not_reachable',
      message:
        'The payment provider does not answer at the moment. Nothing was paid twice; try again in a minute.',
    }
  }
  if (error.statusCode === 404) {
    return {
      code: 'not_found',
      message: 'The payment provider does not know this payment. Check that key and account belong together.',
    }
  }
  return {
    code: 'refused',
    message: `The payment provider refused the request: ${error.message || 'no reason given'}`,
  }
}
