import type { Metadata } from 'next'

import { ProbingCaution } from '@/components/evidence/probing-caution'
import { MeasureForm } from '@/components/findings/measure-form'
import { MethodList } from '@/components/findings/method-list'
import { RunTable } from '@/components/findings/run-table'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Sheet } from '@/components/ui/sheet'
import { measurements, runs } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { measureRing } from './actions'

export const metadata: Metadata = { title: 'Bench' }

export default async function BenchPage({
  params,
  searchParams,
}: PageProps<'/engagements/[engagementId]/bench'>) {
  const { engagementId } = await params
  const { capture, from, to } = await searchParams
  const [captures, methods, stored] = await Promise.all([
    query(measurements.listTraces, { engagementId }),
    query(runs.listMethods, { engagementId }),
    query(runs.listRuns, { engagementId }),
  ])
  const base = `/engagements/${engagementId}`
  return (
    <PageBody>
      <Sheet title="Measure the ring of a capture">
        {captures.length === 0 ? (
          <div className="flex flex-col items-start gap-3">
            <p className="text-ink-soft">
              No capture has been read yet. Add one as delimited text, then measure it here.
            </p>
            <LinkButton href={`${base}/evidence`}>To the evidence</LinkButton>
          </div>
        ) : (
          <MeasureForm
            captures={captures}
            chosenId={typeof capture === 'string' ? capture : undefined}
            window={typeof from === 'string' && typeof to === 'string' ? { from, to } : undefined}
            action={measureRing}
          />
        )}
      </Sheet>
      <Sheet title="Methods">
        <div className="flex flex-col gap-6">
          {methods.map((group) => (
            <section key={group.title} aria-label={group.title}>
              <h3 className="mb-2 border-b border-rule text-base">{group.title}</h3>
              <MethodList base={`${base}/bench`} methods={group.methods} />
            </section>
          ))}
        </div>
      </Sheet>
      {stored.length === 0 ? (
        <EmptyState title="No run yet">
          What is measured or computed here is kept as a run, with its inputs, where they came from, and every
          result. A run that matters becomes a finding.
        </EmptyState>
      ) : (
        <Sheet
          title="Runs"
          flush
          actions={
            <LinkButton href={`${base}/findings/new`} size="small">
              Write a finding
            </LinkButton>
          }
        >
          <RunTable runs={stored} />
        </Sheet>
      )}
      <ProbingCaution />
    </PageBody>
  )
}
