import type { Metadata } from 'next'

import { FindingTable } from '@/components/findings/finding-table'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Sheet } from '@/components/ui/sheet'
import { findingReading } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Findings' }

export default async function FindingsPage({ params }: PageProps<'/engagements/[engagementId]/findings'>) {
  const { engagementId } = await params
  const { findings, mayWrite } = await query(findingReading.listFindings, { engagementId })
  const base = `/engagements/${engagementId}/findings`
  const write = mayWrite ? <LinkButton href={`${base}/new`}>Write a finding</LinkButton> : undefined
  return (
    <PageBody>
      {findings.length === 0 ? (
        <EmptyState title="No finding yet" action={write}>
          {mayWrite
            ? 'Measure a capture or run a method on the bench; a run that matters becomes a finding.'
            : 'Findings appear here as the consultants publish them, each with the numbers it rests on.'}
        </EmptyState>
      ) : (
        <Sheet title="Findings" flush actions={write}>
          <FindingTable base={base} findings={findings} />
        </Sheet>
      )}
    </PageBody>
  )
}
