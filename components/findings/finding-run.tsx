import type { FormAction } from '@/lib/core/action-state'
import type { Recomputation } from '@/lib/domain/findings/recompute.service'
import type { RunDto } from '@/lib/domain/findings/run-dto'

import { FigureSvg } from '../charts/figure-svg'
import { DataTable } from '../ui/data-table'
import { Disclosure } from '../ui/disclosure'
import { Sheet } from '../ui/sheet'
import { choiceColumns, choiceRows } from './choice-tables'
import { RecomputeForm } from './recompute-form'
import { RunChecks } from './run-checks'
import { RunResults } from './run-results'

type FindingRunProps = {
  readonly run: RunDto
  readonly position: number
  readonly recompute: FormAction<Recomputation>
}

/** One run within a finding: numbers, figure and checks, and the way to repeat it. */
export const FindingRun = ({ run, position, recompute }: FindingRunProps) => (
  <Sheet title={`${position}. ${run.title}`}>
    <div className="flex min-w-0 flex-col gap-5">
      <RunResults run={run} />
      {run.figures.map((figure) => (
        <FigureSvg key={figure.id} figure={figure} />
      ))}
      {run.choices.map((table) => (
        <Disclosure key={table.title} summary={table.title}>
          <DataTable
            caption={table.title}
            captionHidden
            columns={choiceColumns(table)}
            rows={choiceRows(table)}
            rowKey={(row) => row.index.toString()}
          />
        </Disclosure>
      ))}
      <div>
        <h3 className="mb-2 text-base">Where it holds</h3>
        <RunChecks run={run} />
      </div>
      <div className="border-t border-rule pt-4">
        <RecomputeForm runId={run.runId} runNumber={run.number} action={recompute} />
      </div>
    </div>
  </Sheet>
)
