import type { EngagementHeading } from '@/lib/domain/engagements/engagement-dto'

import { DataTable } from '../ui/data-table'
import { TextLink } from '../ui/text-link'
import { EngagementStatus } from './engagement-status'

type EngagementTableProps = {
  readonly engagements: readonly EngagementHeading[]
  /** For those who work for several companies. */
  readonly withCompany: boolean
}

export const EngagementTable = ({ engagements, withCompany }: EngagementTableProps) => (
  <DataTable
    caption="Engagements, newest first"
    captionHidden
    rows={engagements}
    rowKey={(engagement) => engagement.engagementId}
    columns={[
      {
        key: 'number',
        header: 'No.',
        cell: (engagement) => <span className="num">{engagement.number}</span>,
        align: 'end',
      },
      {
        key: 'title',
        header: 'Title',
        isRowHeader: true,
        cell: (engagement) => (
          <TextLink href={`/engagements/${engagement.engagementId}`}>{engagement.title}</TextLink>
        ),
      },
      ...(withCompany
        ? [
            {
              key: 'company',
              header: 'Client',
              cell: (engagement: EngagementHeading) => engagement.companyName,
            },
          ]
        : []),
      {
        key: 'status',
        header: 'Status',
        cell: (engagement) => <EngagementStatus status={engagement.status} />,
      },
    ]}
  />
)
