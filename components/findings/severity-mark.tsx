import type { FindingHeading } from '@/lib/domain/findings/finding-dto'

import { StatusMark, type StatusKind } from '../ui/status-mark'

const looks: Record<FindingHeading['severity'], { kind: StatusKind; word: string }> = {
  critical: { kind: 'over-limit', word: 'Critical' },
  major: { kind: 'attention', word: 'Major' },
  minor: { kind: 'active', word: 'Minor' },
  note: { kind: 'closed', word: 'Note' },
}

export const SeverityMark = ({ severity }: Pick<FindingHeading, 'severity'>) => (
  <StatusMark kind={looks[severity].kind}>{looks[severity].word}</StatusMark>
)
