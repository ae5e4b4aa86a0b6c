import type { Metadata } from 'next'

import { FindingForm } from '@/components/findings/finding-form'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Sheet } from '@/components/ui/sheet'
import { runs } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { createFinding } from '../actions'

export const metadata: Metadata = { title: 'Write a finding' }

export default async function NewFindingPage({
  params,
  searchParams,
}: PageProps<'/engagements/[engagementId]/findings/new'>) {
  const { engagementId } = await params
  const { runs: wanted = [] } = await searchParams
  const stored = await query(runs.listRuns, { engagementId })
  const chosen = [wanted].flat().filter((runId) => stored.some((run) => run.runId === runId))
  return (
    <PageBody>
      {stored.length === 0 ? (
        <EmptyState
          title="No run to rest on yet"
          action={<LinkButton href={`/engagements/${engagementId}/bench`}>To the bench</LinkButton>}
        >
          A finding rests on runs, so that every number of it can be opened. Measure or compute something
          first.
        </EmptyState>
      ) : (
        <Sheet title="Write a finding">
          <FindingForm action={createFinding} hidden={{ engagementId }} runs={stored} chosen={chosen} />
        </Sheet>
      )}
    </PageBody>
  )
}
