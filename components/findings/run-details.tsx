import type { FormAction } from '@/lib/core/action-state'
import type { Recomputation } from '@/lib/domain/findings/recompute.service'
import type { RunDto } from '@/lib/domain/findings/run-dto'

import { DescriptionList } from '../ui/description-list'
import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'
import { RecomputeForm } from './recompute-form'
import { RunEvidence } from './run-evidence'

type RunDetailsProps = { readonly run: RunDto; readonly recompute: FormAction<Recomputation> }

/** Who ran what when, on which bytes, and whether it still gives the same. */
export const RunDetails = ({ run, recompute }: RunDetailsProps) => (
  <>
    <Sheet title={`Run ${run.number}`}>
      <DescriptionList
        items={[
          { term: 'Method', detail: `${run.definition.id}, version ${run.methodVersion}` },
          { term: 'By', detail: run.createdBy },
          { term: 'At', detail: <Timestamp instant={run.createdAt} /> },
        ]}
      />
    </Sheet>
    <Sheet title="Compute it again">
      <RecomputeForm runId={run.runId} runNumber={run.number} action={recompute} />
    </Sheet>
    <Sheet title="Evidence">
      <RunEvidence run={run} />
    </Sheet>
  </>
)
