import { LedgerMinutes } from '../hours/ledger-minutes'
import { DataTable } from '../ui/data-table'
import { moneyDigits } from '../ui/money'
import { StatusMark } from '../ui/status-mark'

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
  readonly isOnSale: boolean
}

/** The blocks of hours that the practice sells, and sold. */
export const CatalogueTable = ({ offers }: { readonly offers: readonly Offer[] }) => (
  <DataTable
    caption="Catalogue"
    captionHidden
    rows={offers}
    rowKey={(offer) => offer.offerId}
    columns={[
      {
        key: 'title',
        header: 'Block',
        isRowHeader: true,
        cell: (offer) => <span className="block min-w-36">{offer.title}</span>,
      },
      {
        key: 'hours',
        header: 'Hours',
        align: 'end',
        cell: (offer) => <LedgerMinutes minutes={offer.minutes} />,
      },
      {
        key: 'net',
        header: 'Net',
        kind: 'number',
        value: (offer) => ({ number: moneyDigits(offer.netCents), unit: offer.currency }),
      },
      {
        key: 'tax',
        header: 'Tax',
        kind: 'number',
        value: (offer) => ({ number: moneyDigits(offer.taxCents), unit: offer.currency }),
      },
      {
        key: 'gross',
        header: 'To pay',
        kind: 'number',
        value: (offer) => ({ number: moneyDigits(offer.grossCents), unit: offer.currency }),
      },
      { key: 'treatment', header: 'Tax treatment', cell: (offer) => offer.taxLabel },
      {
        key: 'validity',
        header: 'Valid for',
        kind: 'number',
        value: (offer) => ({ number: String(offer.validityMonths), unit: 'months' }),
      },
      {
        key: 'sale',
        header: 'Sale',
        cell: (offer) => (
          <StatusMark kind={offer.isOnSale ? 'active' : 'closed'}>
            {offer.isOnSale ? 'On sale' : 'Taken off'}
          </StatusMark>
        ),
      },
    ]}
  />
)
