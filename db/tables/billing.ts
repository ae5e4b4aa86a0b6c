export type BlockOfferTable = {
  id: string
  title: string
  minutes: number
  net_cents: number
  currency: string
  validity_months: number
  tax_basis_points: number
  tax_label: string
  created_at: number
  archived_at: number | null
}

export type PurchaseStatus = 'open' | 'paid' | 'failed' | 'expired' | 'refunded'

export type PurchaseTable = {
  id: string
  company_id: string
  person_id: string
  offer_id: string
  title: string
  minutes: number
  validity_months: number
  net_cents: number
  tax_cents: number
  gross_cents: number
  tax_label: string
  currency: string
  status: PurchaseStatus
  session_id: string | null
  receipt_number: number | null
  created_at: number
  paid_at: number | null
}

export type PaymentTable = {
  id: string
  purchase_id: string
  payment_intent_id: string
  gross_cents: number
  currency: string
  balance_transaction_id: string | null
  /** What the provider booked; more or less than what was paid is a difference that the books show. */
  settled_cents: number | null
  settled_currency: string | null
  fee_cents: number | null
  net_cents: number | null
  created_at: number
}

export type ProviderEventOutcome = 'applied' | 'already_applied' | 'ignored' | 'refused'

export type ProviderEventTable = {
  id: string
  type: string
  object_id: string | null
  created_at: number
  received_at: number
  outcome: ProviderEventOutcome
  note: string
}

export type ProviderEffectTable = { object_id: string; effect: string; event_id: string }
