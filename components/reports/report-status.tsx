import { StatusMark, type StatusKind } from '../ui/status-mark'

export type ReportState =
  'draft' | 'in_review' | 'returned' | 'approved' | 'author_signed' | 'released' | 'withdrawn'

const looks: Record<ReportState, { kind: StatusKind; words: string }> = {
  draft: { kind: 'draft', words: 'Draft' },
  in_review: { kind: 'waiting', words: 'In review' },
  returned: { kind: 'attention', words: 'Returned with remarks' },
  approved: { kind: 'waiting', words: 'Approved, not signed' },
  author_signed: { kind: 'waiting', words: 'Signed by the author' },
  released: { kind: 'verified', words: 'Signed and released' },
  withdrawn: { kind: 'closed', words: 'Withdrawn' },
}

export const ReportStatus = ({ status }: { readonly status: ReportState }) => (
  <StatusMark kind={looks[status].kind}>{looks[status].words}</StatusMark>
)
