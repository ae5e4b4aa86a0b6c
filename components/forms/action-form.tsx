'use client'

import { startTransition, useActionState, useId, type FormEvent, type ReactNode } from 'react'

import type { ActionError, ActionState, FormAction } from '@/lib/core/action-state'

import { FormErrorSummary, type FormError } from '../ui/form-error-summary'
import { Notice } from '../ui/notice'
import { SubmitRow } from './submit-row'
import { FormState } from './form-state'

type ActionFormProps = {
  readonly action: FormAction
  readonly children?: ReactNode
  readonly submitLabel: string
  readonly pendingLabel: string
  /** Shown after success on a page that stays. */
  readonly doneMessage?: string | undefined
  /** Names the form for a screen reader when its heading does not. */
  readonly label?: string | undefined
  readonly tone?: 'primary' | 'plain' | 'quiet' | undefined
  readonly size?: 'normal' | 'small' | undefined
  /** Values that the page knows and the person does not type. */
  readonly hidden?: Readonly<Record<string, string>> | undefined
}

/**
 * The one way a form is sent. A refused form keeps every entry, says above what is wrong with links to the fields, and
 * marks the fields themselves.
 */
export const ActionForm = (props: ActionFormProps) => {
  const [state, dispatch, isPending] = useActionState<ActionState, FormData>(props.action, { status: 'idle' })
  const id = useId()

  const send = (event: FormEvent<HTMLFormElement>) => {
    // Sent from here rather than by the form's own action, because that one empties the fields afterwards.
    event.preventDefault()
    if (isPending) return
    const form = new FormData(event.currentTarget, submitterOf(event))
    startTransition(() => dispatch(form))
  }

  return (
    <FormState.Provider value={state}>
      {/* Until the script has loaded the browser sends by itself: by POST, so that no entry ends up in an address. */}
      <form
        id={id}
        method="post"
        onSubmit={send}
        aria-label={props.label}
        noValidate
        className="flex flex-col gap-4"
      >
        {Object.entries(props.hidden ?? {}).map(([name, value]) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        {state.status === 'failed' ? <Refusal error={state.error} /> : null}
        {props.children}
        <SubmitRow
          label={props.submitLabel}
          pendingLabel={props.pendingLabel}
          isPending={isPending}
          tone={props.tone}
          size={props.size}
        />
        {state.status === 'done' && props.doneMessage && !isPending ? (
          <Notice tone="success" live>
            {props.doneMessage}
          </Notice>
        ) : null}
      </form>
    </FormState.Provider>
  )
}

const Refusal = ({ error }: { readonly error: ActionError }) => {
  const fields = Object.entries(error.fields ?? {})
  const errors: FormError[] =
    fields.length > 0
      ? fields.map(([fieldId, message]) => ({ fieldId, message }))
      : [{ message: error.message }]
  return <FormErrorSummary errors={errors} {...(fields.length > 0 ? { title: error.message } : {})} />
}

function submitterOf(event: FormEvent<HTMLFormElement>): HTMLElement | null {
  return event.nativeEvent instanceof SubmitEvent ? event.nativeEvent.submitter : null
}
