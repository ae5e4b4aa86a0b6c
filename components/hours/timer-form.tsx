import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormSelect, FormText } from '../forms/form-fields'
import { Sheet } from '../ui/sheet'
import { workKinds } from './work-kinds'

type TimerFormProps = { readonly engagementId: string; readonly start: FormAction }

/** Starts the timer; it then runs in the header of every page until it is stopped. */
export const TimerForm = ({ engagementId, start }: TimerFormProps) => (
  <Sheet title="Start the timer">
    <ActionForm
      action={start}
      hidden={{ engagementId }}
      submitLabel="Start the timer"
      pendingLabel="Starting…"
      label="Timer"
    >
      <FormSelect
        id="timer-kind"
        name="workKind"
        label="Kind of work"
        options={workKinds}
        placeholder="Choose"
      />
      <FormText
        id="timer-text"
        name="text"
        label="What is being done"
        hint="The client reads this once it is posted"
      />
    </ActionForm>
  </Sheet>
)
