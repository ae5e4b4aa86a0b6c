'use client'

import { useContext } from 'react'

import type { FormAction } from '@/lib/core/action-state'
import type { Recomputation } from '@/lib/domain/findings/recompute.service'

import { ActionForm } from '../forms/action-form'
import { FormState } from '../forms/form-state'
import { StatusMark } from '../ui/status-mark'
import { Timestamp } from '../ui/timestamp'

type RecomputeFormProps = {
  readonly runId: string
  readonly runNumber: number
  readonly action: FormAction<Recomputation>
}

/** Computes a run again from what is stored, and says whether the digits are the same. */
export const RecomputeForm = ({ runId, runNumber, action }: RecomputeFormProps) => (
  <ActionForm
    action={action}
    hidden={{ runId }}
    submitLabel="Recompute"
    pendingLabel="Computing…"
    tone="plain"
    size="small"
    label={`Recompute run ${runNumber}`}
  >
    <Verdict />
  </ActionForm>
)

const Verdict = () => {
  const state = useContext(FormState)
  const answer = state.status === 'done' && isRecomputation(state.value) ? state.value : null
  return (
    <div role="status">
      {answer ? (
        <>
          <StatusMark kind={answer.isSame ? 'verified' : 'over-limit'}>
            {answer.isSame ? 'The same' : 'Different'}
          </StatusMark>
          <p className="mt-1 text-sm [overflow-wrap:anywhere]">{answer.sentence}</p>
          <p className="text-sm text-ink-soft">
            <Timestamp instant={answer.recomputedAt} />
          </p>
        </>
      ) : (
        <p className="text-sm text-ink-soft">
          Repeats the run from its stored inputs and the bytes of its evidence, and compares every digit.
        </p>
      )}
    </div>
  )
}

function isRecomputation(value: unknown): value is Recomputation {
  return typeof value === 'object' && value !== null && 'isSame' in value && 'sentence' in value
}
