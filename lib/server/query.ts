import 'server-only'
import { notFound, redirect } from 'next/navigation'

import type { Result } from '@/lib/core/result'
import type { OpenOperation, Operation } from '@/lib/domain/operation'
import type { InvalidInput, ServiceError } from '@/lib/domain/service-error'

import { container } from './container'
import { requestInfo } from './request-info'
import { currentActor, requireActor } from './session'

/**
 * Runs an operation for a page. Whoever may not see it gets the same "not found" page as for an unknown address.
 */
export async function query<Value, E extends ServiceError>(
  operation: Operation<Value, E>,
  input: unknown = {},
): Promise<Value> {
  const actor = await requireActor()
  const deps = { ...container().deps, request: await requestInfo() }
  const result = await operation.execute(deps, actor, input)
  return result.ok ? result.value : notFound()
}

/** As `query` for the page on which a new member reads the terms, which comes before everything else. */
export async function queryBeforeTerms<Value, E extends ServiceError>(
  operation: Operation<Value, E>,
  input: unknown = {},
): Promise<Value> {
  const actor = await currentActor()
  if (!actor) redirect('/sign-in')
  const deps = { ...container().deps, request: await requestInfo() }
  const result = await operation.execute(deps, actor, input)
  return result.ok ? result.value : notFound()
}

/** Runs an operation that needs no sign-in, for a page that shows its refusal as well. */
export async function openQuery<Value, E extends ServiceError>(
  operation: OpenOperation<Value, E>,
  input: unknown = {},
): Promise<Result<Value, E | InvalidInput>> {
  return operation.execute({ ...container().deps, request: await requestInfo() }, input)
}
