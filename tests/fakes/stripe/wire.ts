type Stored = { readonly id: string; readonly created: number; readonly livemode: false }

/** The objects as they cross the wire; names and shapes are those of the service's public interface. */
export type WireSession = Stored & {
  readonly object: 'checkout.session'
  readonly mode: 'payment'
  readonly client_reference_id: string | null
  readonly customer: null
  readonly customer_email: string | null
  readonly metadata: Record<string, string>
  readonly success_url: string
  readonly cancel_url: string | null
  readonly expires_at: number
  url: string | null
  status: 'open' | 'complete' | 'expired'
  payment_status: 'paid' | 'unpaid'
  amount_subtotal: number
  amount_total: number
  currency: string
  payment_intent: string | null
}

export type WireIntent = Stored & {
  readonly object: 'payment_intent'
  readonly amount: number
  readonly currency: string
  readonly metadata: Record<string, string>
  status: 'processing' | 'succeeded' | 'requires_payment_method'
  latest_charge: string | null
}

export type WireCharge = Stored & {
  readonly object: 'charge'
  readonly amount: number
  readonly currency: string
  readonly payment_intent: string
  readonly status: 'succeeded'
  readonly balance_transaction: string
  amount_refunded: number
  refunded: boolean
  disputed: boolean
}

export type WireBalanceTransaction = Stored & {
  readonly object: 'balance_transaction'
  readonly type: 'charge' | 'refund' | 'adjustment' | 'payout'
  readonly amount: number
  readonly fee: number
  readonly net: number
  readonly currency: string
  readonly source: string
  readonly status: 'available'
}

export type WireRefund = Stored & {
  readonly object: 'refund'
  readonly amount: number
  readonly currency: string
  readonly charge: string
  readonly payment_intent: string
  readonly balance_transaction: string
  readonly status: 'succeeded'
}

export type WireDispute = Stored & {
  readonly object: 'dispute'
  readonly amount: number
  readonly currency: string
  readonly charge: string
  readonly payment_intent: string
  readonly reason: string
  status: 'needs_response' | 'won' | 'lost'
}

export type WirePayout = Stored & {
  readonly object: 'payout'
  readonly amount: number
  readonly currency: string
  readonly status: 'paid'
  readonly arrival_date: number
}

export type WireObject =
  WireSession | WireIntent | WireCharge | WireBalanceTransaction | WireRefund | WireDispute | WirePayout

export type WireEvent = Stored & {
  readonly object: 'event'
  readonly api_version: string
  readonly type: string
  readonly data: { readonly object: unknown }
}
