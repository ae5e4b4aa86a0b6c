import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { FindingForm } from '@/components/findings/finding-form'
import { PageBody } from '@/components/shell/page-body'
import { Sheet } from '@/components/ui/sheet'
import { findingReading, runs } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { editFinding } from '../../actions'

export const metadata: Metadata = { title: 'Edit a finding' }

export default async function EditFindingPage({
  params,
}: PageProps<'/engagements/[engagementId]/findings/[findingId]/edit'>) {
  const { engagementId, findingId } = await params
  const finding = await query(findingReading.getFinding, { findingId })
  const isOpen = finding.mayWrite && finding.status === 'draft'
  if (finding.engagementId !== engagementId || !isOpen) notFound()
  const stored = await query(runs.listRuns, { engagementId })
  return (
    <PageBody>
      <Sheet title={`Finding ${finding.number}`}>
        <FindingForm
          action={editFinding}
          hidden={{ findingId }}
          runs={stored}
          chosen={finding.runs.map((run) => run.runId)}
          initial={finding}
        />
      </Sheet>
    </PageBody>
  )
}
