import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { FindingDetails } from '@/components/findings/finding-details'
import { FindingSheets } from '@/components/findings/finding-sheets'
import { PageBody } from '@/components/shell/page-body'
import { TextLink } from '@/components/ui/text-link'
import { findingReading } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { recomputeRun } from '../../bench/actions'
import { publishFinding } from '../actions'

type Props = PageProps<'/engagements/[engagementId]/findings/[findingId]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { findingId } = await params
  const { number } = await query(findingReading.getFinding, { findingId })
  return { title: `Finding ${number}` }
}

export default async function FindingPage({ params }: Props) {
  const { engagementId, findingId } = await params
  const finding = await query(findingReading.getFinding, { findingId })
  if (finding.engagementId !== engagementId) notFound()
  const isOpen = finding.mayWrite && finding.status === 'draft'
  return (
    <PageBody aside={<FindingDetails finding={finding} publish={isOpen ? publishFinding : undefined} />}>
      <p className="-mb-3 text-sm">
        <TextLink href={`/engagements/${engagementId}/findings`}>All findings</TextLink>
      </p>
      <FindingSheets finding={finding} recompute={recomputeRun} />
    </PageBody>
  )
}
