import type { EngagementHeading } from '@/lib/domain/engagements/engagement-dto'

import { StatusMark, type StatusKind } from '../ui/status-mark'

type Status = EngagementHeading['status']

const marks: Record<Status, { readonly kind: StatusKind; readonly words: string }> = {
  briefed: { kind: 'waiting', words: 'Waits for a scope' },
  scoped: { kind: 'attention', words: 'Scope proposed' },
  active: { kind: 'active', words: 'Active' },
  closed: { kind: 'closed', words: 'Closed' },
}

export const EngagementStatus = ({ status }: { readonly status: Status }) => (
  <StatusMark kind={marks[status].kind}>{marks[status].words}</StatusMark>
)
