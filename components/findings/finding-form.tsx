import type { FormAction } from '@/lib/core/action-state'
import type { FindingDto } from '@/lib/domain/findings/finding-dto'
import type { RunHeading } from '@/lib/domain/findings/run-dto'

import { ActionForm } from '../forms/action-form'
import { FormArea, FormSelect } from '../forms/form-fields'
import { FieldGroup } from '../ui/field-group'
import { ActionRows } from './action-rows'
import { RunChoice } from './run-choice'

const severities = [
  { value: 'critical', label: 'Critical: fails, overheats or breaks' },
  { value: 'major', label: 'Major: margin is lost' },
  { value: 'minor', label: 'Minor: worth doing when the board is opened again' },
  { value: 'note', label: 'Note: nothing to do' },
]

const confidences = [
  { value: 'high', label: 'High: measured, and other causes excluded' },
  { value: 'medium', label: 'Medium: fits, other causes remain' },
  { value: 'low', label: 'Low: a candidate to be tested' },
]

type FindingFormProps = {
  readonly action: FormAction
  readonly hidden: Readonly<Record<string, string>>
  readonly runs: readonly RunHeading[]
  readonly chosen: readonly string[]
  readonly initial?: FindingDto | undefined
}

/** The parts of a finding in the order in which a reader needs them. */
export const FindingForm = ({ action, hidden, runs, chosen, initial }: FindingFormProps) => (
  <ActionForm
    action={action}
    hidden={hidden}
    submitLabel="Save the draft"
    pendingLabel="Saving…"
    label="Finding"
  >
    <RunChoice
      runs={runs.map(({ runId, number, title }) => ({ runId, label: `Run ${number} · ${title}` }))}
      chosen={chosen}
    />
    <FieldGroup legend="What we believe">
      <FormArea
        name="claim"
        label="Claim"
        hint="One sentence that could turn out to be wrong."
        rows={2}
        defaultValue={initial?.claim}
      />
      <FormSelect
        name="severity"
        label="How much it matters"
        placeholder="Choose"
        options={severities}
        defaultValue={initial?.severity ?? ''}
      />
      <FormArea
        name="reasoning"
        label="What it means"
        hint="How the runs lead to the claim, in plain words."
        rows={5}
        defaultValue={initial?.reasoning}
      />
    </FieldGroup>
    <FieldGroup legend="How sure we are">
      <FormSelect
        name="confidence"
        label="Confidence"
        placeholder="Choose"
        options={confidences}
        defaultValue={initial?.confidence ?? ''}
      />
      <FormArea
        name="alternativeCauses"
        label="Other causes it could have"
        rows={3}
        defaultValue={initial?.alternativeCauses}
      />
      <FormArea
        name="disprovingExperiment"
        label="The one experiment that would disprove it"
        rows={3}
        defaultValue={initial?.disprovingExperiment}
      />
    </FieldGroup>
    <FieldGroup
      legend="What to do next"
      hint="Part numbers, values, and what each step costs, such as watts lost."
    >
      <ActionRows initial={initial?.actions ?? []} />
    </FieldGroup>
  </ActionForm>
)
