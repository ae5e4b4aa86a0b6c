import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormSelect } from '../forms/form-fields'
import { LinkButton } from '../ui/link-button'
import { Sheet } from '../ui/sheet'

type SubmitSheetProps = {
  readonly reportId: string
  readonly editHref: string
  readonly reviewers: readonly { readonly personId: string; readonly name: string }[]
  readonly submit: FormAction
}

/** The author's next step: edit once more, or freeze the content and hand it to a reviewer. */
export const SubmitSheet = ({ reportId, editHref, reviewers, submit }: SubmitSheetProps) => (
  <Sheet title="Hand it to a reviewer" actions={<LinkButton href={editHref}>Edit</LinkButton>}>
    <p className="mb-4 max-w-measure text-ink-soft">
      The content is frozen: what the reviewer approves is what both of you sign.
    </p>
    <ActionForm
      action={submit}
      hidden={{ reportId }}
      submitLabel="Submit for review"
      pendingLabel="Freezing…"
    >
      <FormSelect
        name="reviewerId"
        label="Reviewer"
        placeholder="Choose a consultant of this engagement"
        options={reviewers.map(({ personId, name }) => ({ value: personId, label: name }))}
        hint={
          reviewers.length === 0
            ? 'No other consultant is on this engagement yet; an administrator can assign one.'
            : undefined
        }
      />
    </ActionForm>
  </Sheet>
)
