import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormArea, FormSelect } from '../forms/form-fields'
import { Sheet } from '../ui/sheet'

type ReviewSheetProps = {
  readonly reportId: string
  readonly approve: FormAction
  readonly remark: FormAction
  readonly giveBack: FormAction
}

const sections = [
  { value: 'summary', label: 'Summary' },
  { value: 'question', label: 'Question asked' },
  { value: 'evidence', label: 'Evidence reviewed' },
  { value: 'findings', label: 'Findings' },
  { value: 'limits', label: 'Validity and limits' },
  { value: 'methods', label: 'Methods and runs' },
]

/** What a reviewer can do: approve, or remark and return. */
export const ReviewSheet = ({ reportId, approve, remark, giveBack }: ReviewSheetProps) => (
  <Sheet title="Your review">
    <div className="flex flex-col gap-6">
      <ActionForm
        action={approve}
        hidden={{ reportId }}
        submitLabel="Approve the report"
        pendingLabel="Making the PDF…"
        label="Approve"
      />
      <ActionForm
        action={remark}
        hidden={{ reportId }}
        submitLabel="Note the remark"
        pendingLabel="Noting…"
        tone="plain"
        label="Remark"
        doneMessage="Noted."
      >
        <FormSelect name="section" label="Section" options={sections} placeholder="Choose a section" />
        <FormArea name="text" label="Remark" rows={3} />
      </ActionForm>
      <ActionForm
        action={giveBack}
        hidden={{ reportId }}
        submitLabel="Return it to the author"
        pendingLabel="Returning…"
        tone="plain"
        label="Return"
      />
    </div>
  </Sheet>
)
