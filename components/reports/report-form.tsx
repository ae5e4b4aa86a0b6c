import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormArea, FormText } from '../forms/form-fields'
import { FieldGroup } from '../ui/field-group'
import { FindingChoice, type OfferedFinding } from './finding-choice'

type ReportFormProps = {
  readonly action: FormAction
  readonly hidden: Readonly<Record<string, string>>
  readonly findings: readonly OfferedFinding[]
  readonly initial?: {
    readonly title: string
    readonly belief: string
    readonly certainty: string
    readonly nextStep: string
    readonly findingIds: readonly string[]
  }
  readonly submitLabel: string
}

/** Title, findings in their order, and the summary for somebody who decides. */
export const ReportForm = ({ action, hidden, findings, initial, submitLabel }: ReportFormProps) => (
  <ActionForm action={action} hidden={hidden} submitLabel={submitLabel} pendingLabel="Saving…">
    <FormText name="title" label="Title" defaultValue={initial?.title} />
    <FindingChoice findings={findings} chosen={initial?.findingIds ?? []} />
    <FieldGroup
      legend="Summary"
      hint="For the person who decides: it stands on the first page and must make sense without the rest."
    >
      <FormArea name="belief" label="What we believe" rows={3} defaultValue={initial?.belief} />
      <FormArea name="certainty" label="How sure we are" rows={2} defaultValue={initial?.certainty} />
      <FormArea name="nextStep" label="What to do next" rows={2} defaultValue={initial?.nextStep} />
    </FieldGroup>
  </ActionForm>
)
