import type { FormAction } from '@/lib/core/action-state'
import type { ScopeDto } from '@/lib/domain/engagements/scope-dto'

import { ActionForm } from '../forms/action-form'
import { FormArea, FormText } from '../forms/form-fields'
import { Disclosure } from '../ui/disclosure'
import { ScopeVersion } from './scope-version'

type ScopeEditorProps = {
  readonly engagementId: string
  readonly draft: ScopeDto | undefined
  /** What a new version starts from. */
  readonly basis: ScopeDto | undefined
  readonly save: FormAction
  readonly propose: FormAction
}

const hoursText = (minutes: number): string =>
  `${Math.floor(minutes / 60)}:${String(minutes % 60).padStart(2, '0')}`

/** The consultant's draft: seen by the practice alone until it is proposed. */
export const ScopeEditor = ({ engagementId, draft, basis, save, propose }: ScopeEditorProps) => {
  const start = draft ?? basis
  const words = draft ? 'Change the draft' : basis ? 'Write a changed scope' : 'Write the scope'
  return (
    <div className="flex flex-col gap-4">
      {draft ? (
        <div className="border-l-4 border-rule-strong pl-4">
          <ScopeVersion scope={draft} />
          <div className="mt-3">
            <ActionForm
              action={propose}
              hidden={{ scopeId: draft.scopeId }}
              submitLabel={`Propose version ${draft.version}`}
              pendingLabel="Proposing…"
              label="Propose the draft"
            />
          </div>
        </div>
      ) : null}
      <Disclosure summary={words} open={start === undefined}>
        <ActionForm
          key={start?.scopeId ?? 'first'}
          action={save}
          hidden={{ engagementId }}
          submitLabel="Save the draft"
          pendingLabel="Saving…"
          doneMessage="The draft is saved. The client sees it once it is proposed."
          tone={draft ? 'plain' : 'primary'}
          label={words}
        >
          <FormArea
            name="body"
            label="What will be done"
            hint="The question, the steps, what is delivered, and what is left out."
            rows={8}
            defaultValue={start?.body}
          />
          <FormText
            name="capHours"
            label="Hour cap"
            hint="Hours, such as 12, 7.5 or 7:30."
            defaultValue={start ? hoursText(start.capMinutes) : undefined}
          />
        </ActionForm>
      </Disclosure>
    </div>
  )
}
