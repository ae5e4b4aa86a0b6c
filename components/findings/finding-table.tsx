import type { FindingHeading } from '@/lib/domain/findings/finding-dto'

import { DataTable } from '../ui/data-table'
import { TextLink } from '../ui/text-link'
import { Timestamp } from '../ui/timestamp'
import { FindingStatus } from './finding-status'
import { SeverityMark } from './severity-mark'

type FindingTableProps = {
  readonly base: string
  readonly findings: readonly FindingHeading[]
}

export const FindingTable = ({ base, findings }: FindingTableProps) => (
  <DataTable
    caption="Findings by number"
    captionHidden
    rows={findings}
    rowKey={(finding) => finding.findingId}
    columns={[
      {
        key: 'number',
        header: 'No.',
        align: 'end',
        cell: (finding) => <span className="num">{finding.number}</span>,
      },
      {
        key: 'claim',
        header: 'What we believe',
        isRowHeader: true,
        cell: (finding) => (
          <TextLink href={`${base}/${finding.findingId}`} className="inline-block min-w-56">
            {finding.claim}
          </TextLink>
        ),
      },
      { key: 'severity', header: 'Matters', cell: (finding) => <SeverityMark severity={finding.severity} /> },
      { key: 'confidence', header: 'Confidence', cell: ({ confidence }) => confidence },
      { key: 'status', header: 'State', cell: (finding) => <FindingStatus status={finding.status} /> },
      {
        key: 'when',
        header: 'Since',
        cell: (finding) => <Timestamp instant={finding.publishedAt ?? finding.createdAt} dayOnly />,
      },
    ]}
  />
)
