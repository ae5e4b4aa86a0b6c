import type { MethodOutcome } from '@/lib/core/method/method'
import type { RawInput } from '@/lib/core/method/input-definition'
import type { MethodDefinition } from '@/lib/domain/findings/run-definition'

import { FigureSvg } from '../charts/figure-svg'
import { ChoiceTables } from '../findings/choice-tables'
import { FormulaList } from '../findings/formula-list'
import { MethodCaution } from '../findings/method-caution'
import { NoteList } from '../findings/note-list'
import { RunChecks } from '../findings/run-checks'
import { SourceList } from '../findings/source-list'
import { Sheet } from '../ui/sheet'
import { ExampleResults } from './example-results'
import { InputTable } from './input-table'
import { ScriptHint } from './script-hint'

type MethodDocumentProps = {
  readonly definition: MethodDefinition
  readonly example: MethodOutcome
  readonly given: Readonly<Record<string, RawInput>>
}

/** A method from its formula to its sources, made from the very definition that computes. */
export const MethodDocument = ({ definition, example, given }: MethodDocumentProps) => (
  <>
    <Sheet title="Formulas">
      <FormulaList formulas={definition.formulas} />
    </Sheet>
    <Sheet title="Inputs" flush>
      <InputTable inputs={definition.inputs} given={given} />
    </Sheet>
    <Sheet title="Worked example" flush>
      <ExampleResults results={example.results} />
    </Sheet>
    {example.figures.map((figure) => (
      <Sheet key={figure.id} title={figure.title}>
        <FigureSvg figure={figure} />
      </Sheet>
    ))}
    <ChoiceTables choices={example.choices} />
    {example.validity.length > 0 ? (
      <Sheet title="Where it holds, checked on the example">
        <RunChecks run={{ validity: example.validity, warnings: [] }} />
      </Sheet>
    ) : null}
    {definition.notes.length > 0 ? (
      <Sheet title="To know besides">
        <NoteList notes={definition.notes} />
      </Sheet>
    ) : null}
    <Sheet title="Sources">
      <SourceList sources={definition.sources} />
    </Sheet>
    <Sheet title="In a script">
      <ScriptHint methodId={definition.id} given={given} />
    </Sheet>
    <MethodCaution cautions={definition.cautions} />
  </>
)
