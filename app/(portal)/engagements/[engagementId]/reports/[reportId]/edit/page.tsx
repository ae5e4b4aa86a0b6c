import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { ReportForm } from '@/components/reports/report-form'
import { PageBody } from '@/components/shell/page-body'
import { Sheet } from '@/components/ui/sheet'
import { reportReading } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { editReport } from '../../actions'

export const metadata: Metadata = { title: 'Edit the report' }

export default async function EditReportPage({
  params,
}: PageProps<'/engagements/[engagementId]/reports/[reportId]/edit'>) {
  const { engagementId, reportId } = await params
  const report = await query(reportReading.getReport, { reportId })
  if (!report.work?.steps.edit) notFound()
  const findings = await query(reportReading.offeredFindings, { engagementId })
  return (
    <PageBody>
      <Sheet title={`Edit report ${report.number}`}>
        <ReportForm
          action={editReport}
          hidden={{ reportId }}
          findings={findings}
          initial={{ ...report, findingIds: report.work.findingIds }}
          submitLabel="Save the draft"
        />
      </Sheet>
    </PageBody>
  )
}
