import type { ReportRow } from '@/db/repositories/report.repo'
import type { ReportStatus } from '@/db/tables/reports'

/** A report in a list. */
export type ReportHeading = {
  readonly reportId: string
  readonly number: string
  readonly revision: number
  readonly title: string
  readonly status: ReportStatus
  readonly releasedAt: number | null
}

export const reportHeadingOf = (row: ReportRow): ReportHeading => ({
  reportId: row.id,
  number: row.number,
  revision: row.revision,
  title: row.title,
  status: row.status,
  releasedAt: row.released_at,
})
