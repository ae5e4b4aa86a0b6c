import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormSelect } from '../forms/form-fields'
import { Disclosure } from '../ui/disclosure'
import { Sheet } from '../ui/sheet'

type Person = { readonly personId: string; readonly name: string }

type PeopleSheetProps = {
  readonly engagementId: string
  readonly clients: readonly Person[]
  readonly consultants: readonly Person[]
  readonly addable: readonly Person[]
  /** Present where the reader may put colleagues on the engagement and take them off. */
  readonly steps?: { readonly add: FormAction; readonly remove: FormAction } | undefined
}

export const PeopleSheet = ({ engagementId, clients, consultants, addable, steps }: PeopleSheetProps) => (
  <Sheet title="People">
    <h3 className="text-sm text-ink-soft">Of the client</h3>
    <Names people={clients} none="Nobody of the client is on it." />
    <h3 className="mt-3 text-sm text-ink-soft">Consultants</h3>
    <Names people={consultants} none="The practice has not assigned anybody yet." />
    {steps ? (
      <div className="mt-4 flex flex-col gap-1 border-t border-rule pt-3">
        <PersonStep
          summary="Put a colleague on it"
          none="All your colleagues are on it. Invite another under People."
          people={addable}
          {...{ engagementId, action: steps.add }}
        />
        <PersonStep
          summary="Take a colleague off it"
          none="Nobody is on it."
          people={clients}
          {...{ engagementId, action: steps.remove }}
        />
      </div>
    ) : null}
  </Sheet>
)

const Names = ({ people, none }: { readonly people: readonly Person[]; readonly none: string }) =>
  people.length === 0 ? (
    <p className="text-ink-faint">{none}</p>
  ) : (
    <ul>
      {people.map((person) => (
        <li key={person.personId}>{person.name}</li>
      ))}
    </ul>
  )

type PersonStepProps = {
  readonly summary: string
  readonly none: string
  readonly people: readonly Person[]
  readonly engagementId: string
  readonly action: FormAction
}

export const PersonStep = ({ summary, none, people, engagementId, action }: PersonStepProps) => (
  <Disclosure summary={summary}>
    {people.length === 0 ? (
      <p className="text-sm text-ink-soft">{none}</p>
    ) : (
      <ActionForm
        action={action}
        hidden={{ engagementId }}
        submitLabel={summary}
        pendingLabel="Saving…"
        tone="plain"
        size="small"
        label={summary}
      >
        <FormSelect
          name="personId"
          id={`person-${summary.replace(/\s+/g, '-').toLowerCase()}`}
          label="Person"
          placeholder="Choose a person"
          options={people.map(({ personId, name }) => ({ value: personId, label: name }))}
        />
      </ActionForm>
    )}
  </Disclosure>
)
