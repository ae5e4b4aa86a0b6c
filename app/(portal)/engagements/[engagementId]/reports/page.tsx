import type { Metadata } from 'next'

import { ReportTable } from '@/components/reports/report-table'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Sheet } from '@/components/ui/sheet'
import { reportReading } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Reports' }

export default async function ReportsPage({ params }: PageProps<'/engagements/[engagementId]/reports'>) {
  const { engagementId } = await params
  const { reports, mayCompose } = await query(reportReading.listReports, { engagementId })
  const base = `/engagements/${engagementId}/reports`
  const compose = mayCompose ? <LinkButton href={`${base}/new`}>Compose a report</LinkButton> : undefined
  return (
    <PageBody>
      {reports.length === 0 ? (
        <EmptyState title="No report yet" action={compose}>
          {mayCompose
            ? 'Publish the findings first, then compose the report from them.'
            : 'A report appears here when two consultants have signed it. You are mailed then.'}
        </EmptyState>
      ) : (
        <Sheet title="Reports" flush actions={compose}>
          <ReportTable base={base} reports={reports} />
        </Sheet>
      )}
    </PageBody>
  )
}
