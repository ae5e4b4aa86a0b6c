import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { DescriptionList } from '../ui/description-list'
import { Minutes } from '../ui/minutes'
import { Money } from '../ui/money'
import { Quantity } from '../ui/quantity'
import { Sheet } from '../ui/sheet'

type Offer = {
  readonly offerId: string
  readonly title: string
  readonly minutes: number
  readonly validityMonths: number
  readonly netCents: number
  readonly taxCents: number
  readonly grossCents: number
  readonly taxLabel: string
  readonly currency: string
}

type OfferListProps = {
  readonly companyId: string
  readonly offers: readonly Offer[]
  readonly buy: FormAction
}

/** The blocks on sale, each with its whole price and the button that leads to the payment page. */
export const OfferList = ({ companyId, offers, buy }: OfferListProps) => (
  <div className="grid gap-6 sm:grid-cols-2 lg:grid-cols-3">
    {offers.map((offer) => (
      <Sheet key={offer.offerId} title={offer.title}>
        <div className="flex flex-col gap-4">
          <DescriptionList
            items={[
              { term: 'Hours', detail: <Minutes minutes={offer.minutes} /> },
              {
                term: 'Valid for',
                detail: <Quantity value={String(offer.validityMonths)} unit="months" />,
              },
              { term: 'Net', detail: <Money cents={offer.netCents} currency={offer.currency} /> },
              { term: offer.taxLabel, detail: <Money cents={offer.taxCents} currency={offer.currency} /> },
              {
                term: 'To pay',
                detail: (
                  <strong>
                    <Money cents={offer.grossCents} currency={offer.currency} />
                  </strong>
                ),
              },
            ]}
          />
          <ActionForm
            action={buy}
            hidden={{ companyId, offerId: offer.offerId }}
            submitLabel="Pay by card"
            pendingLabel="Opening the payment page…"
            label={`Buy: ${offer.title}`}
          />
        </div>
      </Sheet>
    ))}
  </div>
)
