import { StatusMark, type StatusKind } from '../ui/status-mark'

export type PurchaseStatus = 'open' | 'paid' | 'failed' | 'expired' | 'refunded'

const marks: Record<PurchaseStatus, { readonly kind: StatusKind; readonly words: string }> = {
  open: { kind: 'waiting', words: 'Payment page open' },
  paid: { kind: 'active', words: 'Paid' },
  failed: { kind: 'attention', words: 'Payment failed' },
  expired: { kind: 'closed', words: 'Not finished in time' },
  refunded: { kind: 'closed', words: 'Refunded' },
}

export const PurchaseState = ({ status }: { readonly status: PurchaseStatus }) => (
  <StatusMark kind={marks[status].kind}>{marks[status].words}</StatusMark>
)
