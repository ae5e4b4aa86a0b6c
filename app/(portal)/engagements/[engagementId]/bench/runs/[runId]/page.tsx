import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { RunDetails } from '@/components/findings/run-details'
import { RunSheets } from '@/components/findings/run-sheets'
import { PageBody } from '@/components/shell/page-body'
import { LinkButton } from '@/components/ui/link-button'
import { TextLink } from '@/components/ui/text-link'
import { engagements, runs } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { recomputeRun } from '../../actions'

type Props = PageProps<'/engagements/[engagementId]/bench/runs/[runId]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { runId } = await params
  const { number, title } = await query(runs.getRun, { runId })
  return { title: `Run ${number}, ${title}` }
}

/** The method that usually comes next, with this run's results taken over where they fit. */
const following: Readonly<Record<string, { readonly methodId: string; readonly label: string }>> = {
  'ring-measurement': { methodId: 'ring-parasitics', label: 'Find the parasitics' },
  'ring-parasitics': { methodId: 'rc-snubber', label: 'Size a snubber' },
}

export default async function RunPage({ params }: Props) {
  const { engagementId, runId } = await params
  const [run, { may }] = await Promise.all([
    query(runs.getRun, { runId }),
    query(engagements.getHeading, { engagementId }),
  ])
  if (run.engagementId !== engagementId) notFound()
  const base = `/engagements/${engagementId}`
  const next = following[run.methodId]
  return (
    <PageBody aside={<RunDetails run={run} recompute={recomputeRun} />}>
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div className="min-w-0">
          {may.compute ? (
            <p className="text-sm">
              <TextLink href={`${base}/bench`}>Bench</TextLink>
            </p>
          ) : null}
          <h2 className="mt-1 text-xl [overflow-wrap:anywhere]">{run.title}</h2>
        </div>
        {may.compute ? (
          <div className="flex flex-wrap gap-3">
            {next ? (
              <LinkButton href={`${base}/bench/${next.methodId}?from=${runId}`}>{next.label}</LinkButton>
            ) : null}
            <LinkButton href={`${base}/findings/new?runs=${runId}`} tone="primary">
              Write a finding
            </LinkButton>
          </div>
        ) : null}
      </div>
      <RunSheets run={run} />
    </PageBody>
  )
}
