import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { ComparisonForm } from '@/components/capture-viewer/comparison-form'
import { ComparisonSheet } from '@/components/capture-viewer/comparison-sheet'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { Sheet } from '@/components/ui/sheet'
import { comparisons } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Compare captures' }

type Props = PageProps<'/engagements/[engagementId]/evidence/compare'>

export default async function ComparePage({ params, searchParams }: Props) {
  const { engagementId } = await params
  const wanted = await searchParams
  const [first, second] = [chosen(wanted['first']), chosen(wanted['second'])]
  const captures = await query(comparisons.listComparable, { engagementId })
  const compared =
    first && second
      ? await query(comparisons.compareCaptures, {
          first: first.evidenceId,
          firstChannel: first.channel,
          second: second.evidenceId,
          secondChannel: second.channel,
        })
      : null
  if (compared && compared.engagementId !== engagementId) notFound()
  return (
    <PageBody>
      <Sheet title="Compare two captures">
        {captures.length === 0 ? (
          <EmptyState title="No capture yet">
            Two captures can be laid over each other once they are among the evidence.
          </EmptyState>
        ) : (
          <ComparisonForm captures={captures} first={first} second={second} />
        )}
      </Sheet>
      {compared && second ? <ComparisonSheet {...compared} secondChannel={second.channel} /> : null}
    </PageBody>
  )
}

/** "id:channel" of the address; nothing for anything else. */
function chosen(value: string | string[] | undefined) {
  const [, evidenceId, channel] = /^([0-9a-z]{26}):(\d{1,2})$/.exec(String(value)) ?? []
  return evidenceId === undefined ? undefined : { evidenceId, channel: Number(channel) }
}
