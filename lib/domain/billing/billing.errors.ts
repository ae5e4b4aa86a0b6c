import type { ServiceError } from '../service-error'

export type BillingError = ServiceError<'no_such_offer' | 'payments_unavailable' | 'invalid_signature'>

export const noSuchOffer: BillingError = {
  code: 'no_such_offer',
  message: 'This block is no longer on sale. Open the page again to see what is.',
}

export const paymentsUnavailable: BillingError = {
  code: 'payments_unavailable',
  message: 'The payment provider does not answer just now. Nothing was paid; try again in a minute.',
}
