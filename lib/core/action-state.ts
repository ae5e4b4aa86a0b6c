/** What a form knows of its last submission. The form itself keeps what was typed. */
export type ActionState<Value = unknown> =
  | { readonly status: 'idle' }
  | { readonly status: 'done'; readonly value: Value }
  | { readonly status: 'failed'; readonly error: ActionError }

export type ActionError = {
  readonly code: string
  readonly message: string
  readonly fields?: Readonly<Record<string, string>>
}

/** The signature of every form action. */
export type FormAction<Value = unknown> = (
  previous: ActionState,
  form: FormData,
) => Promise<ActionState<Value>>
