import type { EvidenceDto } from '@/lib/domain/evidence/evidence-dto'

import { StatusMark, type StatusKind } from '../ui/status-mark'

type Status = EvidenceDto['status']

const marks: Record<Status, { readonly kind: StatusKind; readonly words: string }> = {
  checking: { kind: 'waiting', words: 'Being checked' },
  ready: { kind: 'active', words: 'Ready' },
  refused: { kind: 'over-limit', words: 'Not readable' },
}

export const EvidenceStatus = ({ status }: { readonly status: Status }) => (
  <StatusMark kind={marks[status].kind}>{marks[status].words}</StatusMark>
)
