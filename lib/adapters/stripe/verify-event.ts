import Stripe from 'stripe'

import { err, ok, type Result } from '@/lib/core/result'
import type { EventRefusal, ProviderEvent } from '@/lib/ports/payments'

import { providerEvent } from './provider-event'

/** How far the signed time may lie before or after our clock. The SDK alone would accept any time to come. */
const toleranceSeconds = 300

/** Verifies a delivery: its time, the signature over the raw body, and only then its content. */
export function verifyEvent(
  webhookSecret: string,
  rawBody: string,
  signatureHeader: string | null,
  now: number,
): Result<ProviderEvent, EventRefusal> {
  const signedAt = signedTime(signatureHeader ?? '')
  if (signatureHeader === null || signedAt === null) return err('invalid_signature')
  const ageSeconds = Math.floor(now / 1000) - signedAt
  if (ageSeconds > toleranceSeconds) return err('too_old')
  if (ageSeconds < -toleranceSeconds) return err('in_future')
  if (!isSigned(webhookSecret, rawBody, signatureHeader, now)) return err('invalid_signature')
  const event = providerEvent.safeParse(jsonOf(rawBody))
  return event.success ? ok(event.data) : err('malformed')
}

/** The time in seconds that the header claims; null unless it claims exactly one. */
function signedTime(header: string): number | null {
  const times = header.split(',').filter((part) => part.startsWith('t='))
  const digits = /^t=(\d{1,12})$/.exec(times.join(','))?.[1]
  return digits === undefined ? null : Number(digits)
}

function isSigned(secret: string, rawBody: string, header: string, now: number): boolean {
  try {
    const verified = Stripe.webhooks.signature?.verifyHeader(
      rawBody,
      header,
      secret,
      toleranceSeconds,
      undefined,
      now,
    )
    return verified === true
  } catch {
    // Whatever the verifier trips over in a header from outside, the delivery is not proven to be the provider's.
    return false
  }
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return undefined
  }
}
