import type { RunDto } from '@/lib/domain/findings/run-dto'

import { FigureSvg } from '../charts/figure-svg'
import { Sheet } from '../ui/sheet'
import { TextLink } from '../ui/text-link'
import { ChoiceTables } from './choice-tables'
import { FormulaList } from './formula-list'
import { MethodCaution } from './method-caution'
import { NoteList } from './note-list'
import { RunChecks } from './run-checks'
import { RunOrigins } from './run-origins'
import { RunResults } from './run-results'
import { SourceList } from './source-list'

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
    <Sheet title="About the method">
      <div className="flex flex-col gap-4">
        <p className="max-w-measure">{run.definition.purpose}</p>
        <FormulaList formulas={run.definition.formulas} />
        <NoteList notes={run.definition.notes} />
        <SourceList sources={run.definition.sources} />
        {run.trace ? null : (
          <p>
            <TextLink href={`/methods/${run.methodId}`}>Ranges, worked example and use in scripts</TextLink>
          </p>
        )}
      </div>
    </Sheet>
    <MethodCaution cautions={run.definition.cautions} />
  </>
)
