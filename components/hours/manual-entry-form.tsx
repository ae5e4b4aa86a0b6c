import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { Disclosure } from '../ui/disclosure'
import { Sheet } from '../ui/sheet'
import { TimeFields } from './time-fields'

type ManualEntryFormProps = { readonly engagementId: string; readonly add: FormAction }

/** Time that was worked without the timer. */
export const ManualEntryForm = ({ engagementId, add }: ManualEntryFormProps) => (
  <Sheet>
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
        <TimeFields idPrefix="entry" />
      </ActionForm>
    </Disclosure>
  </Sheet>
)
