import 'server-only'
import { revalidatePath } from 'next/cache'
import { headers } from 'next/headers'
import { redirect } from 'next/navigation'

import type { ActionError, ActionState, FormAction } from '@/lib/core/action-state'
import type { Result } from '@/lib/core/result'
import type { OpenOperation, Operation } from '@/lib/domain/operation'
import type { ServiceError } from '@/lib/domain/service-error'

import { container } from './container'
import { formInput } from './form-input'
import { requestInfo, requestInfoWithBrowser } from './request-info'
import { isSameOrigin } from './same-origin'
import { currentActor } from './session'

type After<Value> = {
  /** Where the browser goes after success; absent means the page stays and is shown afresh. */
  readonly goTo?: (value: Value) => string
}

const foreignOrigin: ActionError = {
  code: 'foreign_origin',
  message: 'This form was not sent from the portal itself. Open the page again and send it from there.',
}

const signedOut: ActionError = {
  code: 'signed_out',
  message:
    'You are signed out. Sign in in another tab, then send this form again: nothing you typed is lost.',
}

/** Makes a form action of an operation: our origin, the signed-in person, the operation, and what comes after. */
export function action<Value, E extends ServiceError>(
  operation: Operation<Value, E>,
  after: After<Value> = {},
): FormAction<Value> {
  return async (_previous, form) => {
    if (!(await isFromOurOrigin())) return failed(foreignOrigin)
    const actor = await currentActor()
    if (!actor) return failed(signedOut)
    const request = await requestInfo()
    const result = await operation.execute({ ...container().deps, request }, actor, formInput(form))
    if (!result.ok) {
      container().log.warn(
        {
          requestId: request.id,
          personId: actor.personId,
          operation: operation.name,
          reason: result.error.code,
        },
        'operation refused',
      )
    }
    return finish(result, after)
  }
}

/** As `action` for an operation that needs no sign-in. */
export function openAction<Value, E extends ServiceError>(
  operation: OpenOperation<Value, E>,
  after: After<Value> = {},
): FormAction<Value> {
  return async (_previous, form) => {
    if (!(await isFromOurOrigin())) return failed(foreignOrigin)
    const request = await requestInfoWithBrowser()
    return finish(await operation.execute({ ...container().deps, request }, formInput(form)), after)
  }
}

async function isFromOurOrigin(): Promise<boolean> {
  const head = await headers()
  return isSameOrigin(head.get('origin'), container().env.publicUrl)
}

function finish<Value>(result: Result<Value, ServiceError>, after: After<Value>): ActionState<Value> {
  if (!result.ok) return failed(result.error)
  if (after.goTo) redirect(after.goTo(result.value))
  revalidatePath('/', 'layout')
  return { status: 'done', value: result.value }
}

function failed(error: ActionError): { readonly status: 'failed'; readonly error: ActionError } {
  const { code, message, fields } = error
  return { status: 'failed', error: { code, message, ...(fields ? { fields } : {}) } }
}
