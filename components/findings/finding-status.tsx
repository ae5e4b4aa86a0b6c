import type { FindingHeading } from '@/lib/domain/findings/finding-dto'

import { StatusMark } from '../ui/status-mark'

export const FindingStatus = ({ status }: Pick<FindingHeading, 'status'>) =>
  status === 'draft' ? (
    <StatusMark kind="draft">Draft</StatusMark>
  ) : (
    <StatusMark kind="active">Published</StatusMark>
  )
