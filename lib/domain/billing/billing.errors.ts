import type { ServiceError } from '../service-error'

export type BillingError = ServiceError<
  'no_such_offer' | 'payments_unavailable' | 'payments_refused' | 'invalid_signature'
>

export const noSuchOffer: BillingError = {
  code: 'no_such_offer',
  message: 'This block is no longer on sale. Open the page again to see what is.',
}

export const paymentsUnavailable: BillingError = {
  code: 'payments_unavailable',
  message:
    'The payment provider does not answer just now. Nothing was paid; try again in a minute, it is still the same purchase.',
}

export const paymentsRefused: BillingError = {
  code: 'payments_refused',
  message:
    'The payment provider did not accept the order. Nothing was paid; tell the practice before you try again.',
}

export const notAccepted = (reason: string): BillingError => ({
  code: 'invalid_signature',
  message: `The delivery was not accepted: ${reason.replaceAll('_', ' ')}.`,
})
