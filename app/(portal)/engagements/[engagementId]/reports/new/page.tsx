import type { Metadata } from 'next'

import { ReportForm } from '@/components/reports/report-form'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Sheet } from '@/components/ui/sheet'
import { reportReading } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { createReport } from '../actions'

export const metadata: Metadata = { title: 'Compose a report' }

export default async function NewReportPage({
  params,
}: PageProps<'/engagements/[engagementId]/reports/new'>) {
  const { engagementId } = await params
  const findings = await query(reportReading.offeredFindings, { engagementId })
  return (
    <PageBody>
      {findings.length === 0 ? (
        <EmptyState
          title="Nothing to report yet"
          action={<LinkButton href={`/engagements/${engagementId}/findings`}>To the findings</LinkButton>}
        >
          A report is composed of published findings. Publish one first.
        </EmptyState>
      ) : (
        <Sheet title="Compose a report">
          <ReportForm
            action={createReport}
            hidden={{ engagementId }}
            findings={findings}
            submitLabel="Save the draft"
          />
        </Sheet>
      )}
    </PageBody>
  )
}
