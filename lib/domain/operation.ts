import 'server-only'
import type { z } from 'zod'

import type { Actor } from '@/lib/authz/actor'
import { err, type Result } from '@/lib/core/result'

import type { Deps } from './deps'
import type { InvalidInput, ServiceError } from './service-error'

/**
 * One thing a signed-in person can ask the portal to do or tell. `execute` takes input that nobody has checked.
 * The name is the entry of the authorisation matrix: an operation that is not in it fails the tests.
 */
export type Operation<Value = unknown, E extends ServiceError = ServiceError> = {
  readonly kind: 'operation'
  readonly name: string
  readonly schema: z.ZodType
  readonly execute: (deps: Deps, actor: Actor, input: unknown) => Promise<Result<Value, E | InvalidInput>>
}

/** One thing that needs no sign-in, such as opening an invitation or checking a report. */
export type OpenOperation<Value = unknown, E extends ServiceError = ServiceError> = {
  readonly kind: 'open-operation'
  readonly name: string
  readonly schema: z.ZodType
  readonly execute: (deps: Deps, input: unknown) => Promise<Result<Value, E | InvalidInput>>
}

type AnyResult = Result<unknown, ServiceError>
type ValueOf<R> = R extends { readonly ok: true; readonly value: infer Value } ? Value : never
type ErrorOf<R> = R extends { readonly ok: false; readonly error: infer E extends ServiceError } ? E : never

export function operation<S extends z.ZodType, R extends AnyResult>(
  name: string,
  schema: S,
  run: (deps: Deps, actor: Actor, input: z.output<S>) => Promise<R>,
): Operation<ValueOf<R>, ErrorOf<R>> {
  return {
    kind: 'operation',
    name,
    schema,
    execute: async (deps, actor, input) => {
      const parsed = schema.safeParse(input)
      return parsed.success ? widen(await run(deps, actor, parsed.data)) : err(invalidInput(parsed.error))
    },
  }
}

export function openOperation<S extends z.ZodType, R extends AnyResult>(
  name: string,
  schema: S,
  run: (deps: Deps, input: z.output<S>) => Promise<R>,
): OpenOperation<ValueOf<R>, ErrorOf<R>> {
  return {
    kind: 'open-operation',
    name,
    schema,
    execute: async (deps, input) => {
      const parsed = schema.safeParse(input)
      return parsed.success ? widen(await run(deps, parsed.data)) : err(invalidInput(parsed.error))
    },
  }
}

/** TypeScript cannot see that a result type taken apart and put together again is the same type. */
function widen<R extends AnyResult>(result: R): Result<ValueOf<R>, ErrorOf<R>> {
  return result as unknown as Result<ValueOf<R>, ErrorOf<R>>
}

function invalidInput(error: z.ZodError): InvalidInput {
  const fields: Record<string, string> = {}
  for (const issue of error.issues) {
    const path = issue.path.join('.') || 'form'
    fields[path] ??= issue.message
  }
  return { code: 'invalid_input', message: 'Some entries need another look; each is marked below.', fields }
}
