import type { FormAction } from '@/lib/core/action-state'
import type { ScopeDto } from '@/lib/domain/engagements/scope-dto'

import { ActionForm } from '../forms/action-form'
import { FormArea } from '../forms/form-fields'
import { Disclosure } from '../ui/disclosure'
import { minutesInWords } from '../ui/minutes'

type ScopeDecisionProps = {
  readonly scope: ScopeDto
  readonly approve: FormAction
  readonly decline: FormAction
}

/** The purchaser's answer; only approved hours can ever be posted. */
export const ScopeDecision = ({ scope, approve, decline }: ScopeDecisionProps) => (
  <div className="mt-4 flex flex-col gap-3 border-l-4 border-copper pl-4">
    <p className="text-sm text-ink-soft">
      Once approved, up to {minutesInWords(scope.capMinutes)} can be posted against your hours. Anything
      beyond needs your approval again.
    </p>
    <ActionForm
      action={approve}
      hidden={{ scopeId: scope.scopeId }}
      submitLabel={`Approve version ${scope.version}`}
      pendingLabel="Approving…"
      label="Approve the scope"
    />
    <Disclosure summary="Decline it">
      <ActionForm
        action={decline}
        hidden={{ scopeId: scope.scopeId }}
        submitLabel="Decline with this note"
        pendingLabel="Declining…"
        tone="plain"
        label="Decline the scope"
      >
        <FormArea name="note" label="What should be different" rows={3} />
      </ActionForm>
    </Disclosure>
  </div>
)
