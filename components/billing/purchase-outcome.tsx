import { minutesInWords } from '../ui/minutes'
import { Notice } from '../ui/notice'
import { dayInWords } from '../ui/timestamp'
import type { PurchaseAnswer } from './purchase-answer'

type PurchaseOutcomeProps = {
  readonly purchase: PurchaseAnswer
  /** The last question got no answer. */
  readonly isSilent: boolean
}

/** Where the purchase stands, in plain words. */
export const PurchaseOutcome = ({ purchase, isSilent }: PurchaseOutcomeProps) => {
  switch (purchase.standing) {
    case 'not_begun':
      return (
        <Notice tone="caution" title="The payment page did not open">
          Nothing was paid. Try again: it is still the same purchase.
        </Notice>
      )
    case 'open':
      return (
        <Notice live title="Waiting for the payment provider">
          {isSilent
            ? 'The portal does not answer just now; this page goes on asking.'
            : 'You can leave this page: the hours are credited as soon as the provider tells us of the payment, and the receipt goes out by e-mail. If you have not paid, nothing will happen.'}
        </Notice>
      )
    case 'arriving':
      return (
        <Notice live title="Waiting for the money to arrive">
          The payment is set up, and the bank has not confirmed it yet. That can take some days. The hours are
          credited when it has, and the receipt goes out by e-mail.
        </Notice>
      )
    case 'paid':
      return (
        <Notice tone="success" live title={`${minutesInWords(purchase.minutes)} are credited`}>
          {purchase.validUntil === null ? '' : `They are valid until ${dayInWords(purchase.validUntil)}. `}
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
      return (
        <Notice live title="The payment was refunded">
          Ask the practice if you did not expect this.
        </Notice>
      )
  }
}
