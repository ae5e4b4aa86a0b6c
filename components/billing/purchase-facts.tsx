import { DescriptionList } from '../ui/description-list'
import { Minutes } from '../ui/minutes'
import { Money } from '../ui/money'
import type { PurchaseAnswer } from './purchase-answer'

/** What was ordered, to the cent. */
export const PurchaseFacts = ({ purchase }: { readonly purchase: PurchaseAnswer }) => {
  const { currency, receiptNumber } = purchase
  const money = (cents: number) => <Money cents={cents} currency={currency} />
  return (
    <DescriptionList
      items={[
        { term: 'Block', detail: purchase.title },
        { term: 'Hours', detail: <Minutes minutes={purchase.minutes} /> },
        { term: 'Net', detail: money(purchase.netCents) },
        { term: purchase.taxLabel, detail: money(purchase.taxCents) },
        { term: 'To pay', detail: <strong>{money(purchase.grossCents)}</strong> },
        ...(receiptNumber === null
          ? []
          : [{ term: 'Receipt', detail: <span className="num">{receiptNumber}</span> }]),
      ]}
    />
  )
}
