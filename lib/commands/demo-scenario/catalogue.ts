import type { Tx } from '@/db/client'
import type { Deps } from '@/lib/domain/deps'

const offers = [
  { title: 'Ten hours', minutes: 600, net_cents: 185_000, validity_months: 12 },
  { title: 'Twenty-five hours', minutes: 1_500, net_cents: 440_000, validity_months: 18 },
  { title: 'Sixty hours', minutes: 3_600, net_cents: 996_000, validity_months: 24 },
] as const

/** The blocks of hours that the demo practice sells. */
export async function seedCatalogue(tx: Tx, deps: Deps): Promise<void> {
  for (const offer of offers) {
    await tx
      .insertInto('block_offer')
      .values({
        id: deps.ids.newId(),
        ...offer,
        currency: 'EUR',
        tax_basis_points: 1_900,
        tax_label: 'VAT 19 %',
        created_at: deps.clock.now(),
        archived_at: null,
      })
      .execute()
  }
}
