import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormSelect, FormText } from '../forms/form-fields'
import { Disclosure } from '../ui/disclosure'
import { workKinds } from './work-kinds'

type ManualEntryFormProps = { readonly engagementId: string; readonly add: FormAction }

/** Time that was worked without the timer. */
export const ManualEntryForm = ({ engagementId, add }: ManualEntryFormProps) => (
  <Disclosure summary="Enter time by hand">
    <ActionForm
      action={add}
      hidden={{ engagementId }}
      submitLabel="Add as a draft"
      pendingLabel="Adding…"
      tone="plain"
      label="Time by hand"
      doneMessage="Added to your drafts."
    >
      <FormSelect
        id="entry-kind"
        name="workKind"
        label="Kind of work"
        options={workKinds}
        placeholder="Choose"
      />
      <FormText id="entry-text" name="text" label="What was done" />
      <FormText id="entry-start" name="startedAt" label="Begun (UTC)" type="datetime-local" />
      <FormText id="entry-minutes" name="workedMinutes" label="Minutes worked" inputMode="numeric" />
    </ActionForm>
  </Disclosure>
)
