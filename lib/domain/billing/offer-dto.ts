import type { OfferRow } from '@/db/repositories/offer.repo'
import { cents } from '@/lib/core/money/cents'
import { taxOn } from '@/lib/core/money/proportion'

/** A block on sale with its price in full. */
export type OfferDto = {
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

export function offerOf(row: OfferRow): OfferDto {
  const taxCents = taxOn(cents(row.net_cents), row.tax_basis_points)
  return {
    offerId: row.id,
    title: row.title,
    minutes: row.minutes,
    validityMonths: row.validity_months,
    netCents: row.net_cents,
    taxCents,
    grossCents: row.net_cents + taxCents,
    taxLabel: row.tax_label,
    currency: row.currency,
  }
}
