import type { ReactNode } from 'react'

import type { FormAction } from '@/lib/core/action-state'
import type { FindingDto } from '@/lib/domain/findings/finding-dto'
import type { Recomputation } from '@/lib/domain/findings/recompute.service'

import { Sheet } from '../ui/sheet'
import { FindingRun } from './finding-run'
import { FindingText } from './finding-text'
import { MethodCaution } from './method-caution'
import { NextSteps } from './next-steps'

type FindingSheetsProps = {
  readonly finding: FindingDto
  readonly recompute: FormAction<Recomputation>
}

const confidences: Record<FindingDto['confidence'], string> = {
  high: 'High confidence: measured, and other causes excluded.',
  medium: 'Medium confidence: it fits, and other causes remain.',
  low: 'Low confidence: a candidate to be tested.',
}

/** What we believe, how sure we are, what to do next; then the numbers, each of which opens. */
export const FindingSheets = ({ finding, recompute }: FindingSheetsProps) => (
  <>
    <Sheet title="What we believe">
      <div className="flex flex-col gap-3">
        <p className="max-w-measure font-serif text-lg font-semibold">{finding.claim}</p>
        <FindingText>{finding.reasoning}</FindingText>
      </div>
    </Sheet>
    <Sheet title="How sure we are">
      <div className="flex flex-col gap-3">
        <p className="font-semibold">{confidences[finding.confidence]}</p>
        <Part title="Other causes it could have">{finding.alternativeCauses}</Part>
        <Part title="What would disprove it">{finding.disprovingExperiment}</Part>
      </div>
    </Sheet>
    <Sheet title="What to do next">
      <NextSteps actions={finding.actions} />
    </Sheet>
    <section aria-labelledby="numbers" className="flex min-w-0 flex-col gap-6">
      <div>
        <h2 id="numbers" className="text-xl">
          The numbers
        </h2>
        <p className="text-ink-soft">
          Each opens to its formula, its source, its inputs, and the bytes of evidence that it came from.
        </p>
      </div>
      {finding.runs.map((run, position) => (
        <FindingRun key={run.runId} run={run} position={position + 1} recompute={recompute} />
      ))}
    </section>
    <MethodCaution cautions={finding.runs.flatMap((run) => run.definition.cautions)} />
    <p className="max-w-measure text-sm text-ink-soft">
      These are engineering estimates on the evidence named, never a statement of conformity: that is for an
      accredited laboratory under the standard and edition in force. Local codes and licensed practice come
      first.
    </p>
  </>
)

const Part = ({ title, children }: { readonly title: ReactNode; readonly children: string }) =>
  children === '' ? null : (
    <div>
      <h3 className="text-base">{title}</h3>
      <FindingText>{children}</FindingText>
    </div>
  )
