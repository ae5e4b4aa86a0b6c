import { DataTable } from '../ui/data-table'
import { TextLink } from '../ui/text-link'
import { Timestamp } from '../ui/timestamp'
import { ReportStatus, type ReportState } from './report-status'

type Row = {
  readonly reportId: string
  readonly number: string
  readonly revision: number
  readonly title: string
  readonly status: ReportState
  readonly releasedAt: number | null
}

export const ReportTable = ({
  base,
  reports,
}: {
  readonly base: string
  readonly reports: readonly Row[]
}) => (
  <DataTable
    caption="Reports of this engagement"
    captionHidden
    rows={reports}
    rowKey={(report) => report.reportId}
    columns={[
      {
        key: 'title',
        header: 'Report',
        isRowHeader: true,
        cell: (report) => <TextLink href={`${base}/${report.reportId}`}>{report.title}</TextLink>,
      },
      {
        key: 'number',
        header: 'Number',
        cell: (report) => (
          <span className="num">
            {report.number}, rev. {report.revision}
          </span>
        ),
      },
      { key: 'status', header: 'State', cell: (report) => <ReportStatus status={report.status} /> },
      {
        key: 'released',
        header: 'Released',
        cell: (report) => (report.releasedAt === null ? '—' : <Timestamp instant={report.releasedAt} />),
      },
    ]}
  />
)
