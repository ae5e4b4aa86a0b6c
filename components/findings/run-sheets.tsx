import type { RunDto } from '@/lib/domain/findings/run-dto'

import { FigureSvg } from '../charts/figure-svg'
import { Caution } from '../ui/caution'
import { Sheet } from '../ui/sheet'
import { ChoiceTables } from './choice-tables'
import { RunChecks } from './run-checks'
import { RunOrigins } from './run-origins'
import { RunResults } from './run-results'

/** A run from its answer down to its notes. */
export const RunSheets = ({ run }: { readonly run: RunDto }) => (
  <>
    <Sheet title="Results">
      <RunResults run={run} />
    </Sheet>
    {run.figures.map((figure) => (
      <Sheet key={figure.id} title={figure.title}>
        <FigureSvg figure={figure} />
      </Sheet>
    ))}
    <ChoiceTables choices={run.choices} />
    <Sheet title="Where it holds">
      <RunChecks run={run} />
    </Sheet>
    <Sheet title="What went in">
      <RunOrigins run={run} />
    </Sheet>
    <MethodNotes run={run} />
    {run.definition.cautions.length > 0 ? (
      <Caution title="Before you touch the board">
        <ul>
          {run.definition.cautions.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      </Caution>
    ) : null}
  </>
)

const MethodNotes = ({ run }: { readonly run: RunDto }) => (
  <Sheet title="About the method">
    <p className="max-w-measure">{run.definition.purpose}</p>
    <ul className="my-3 flex flex-col gap-1">
      {run.definition.formulas.map((formula) => (
        <li key={formula} className="num text-sm [overflow-wrap:anywhere]">
          {formula}
        </li>
      ))}
    </ul>
    <ul className="flex max-w-measure list-disc flex-col gap-1 pl-5 text-sm">
      {run.definition.notes.map((note) => (
        <li key={note}>{note}</li>
      ))}
      {run.definition.sources.map(({ citation, standing }) => (
        <li key={citation}>
          {citation} <span className="text-ink-faint">({standing})</span>
        </li>
      ))}
    </ul>
  </Sheet>
)
