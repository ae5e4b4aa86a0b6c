import 'server-only'

import type { Actor } from '@/lib/authz/actor'
import type { Deps } from '@/lib/domain/deps'
import type { ServiceError } from '@/lib/domain/service-error'

import { container } from './container'
import { requestInfo } from './request-info'
import { isSameOrigin } from './same-origin'
import { currentActor } from './session'

const statusOf: Readonly<Record<string, number>> = {
  invalid_input: 400,
  invalid_signature: 400,
  signed_out: 401,
  not_permitted: 403,
  foreign_origin: 403,
  not_found: 404,
  too_large: 413,
  throttled: 429,
  internal: 500,
  unavailable: 503,
  no_space: 507,
}

/** Answers that are data and no page: no cache keeps them, and a browser that opens one runs and frames nothing. */
const dataHeaders = {
  'cache-control': 'private, no-store',
  'content-security-policy': "default-src 'none'; frame-ancestors 'none'",
}

/** An error as RFC 9457 "problem details"; an expected failure without a status of its own is 409. */
export function problem(error: ServiceError, requestId: string): Response {
  const status = statusOf[error.code] ?? 409
  const body = {
    type: `about:blank#${error.code}`,
    title: error.message,
    status,
    code: error.code,
    requestId,
    ...(error.fields ? { fields: error.fields } : {}),
  }
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': 'application/problem+json', ...dataHeaders },
  })
}

const internal: ServiceError = {
  code: 'internal',
  message:
    'Something went wrong on our side. Nothing was changed; try again, and quote the request id if it stays.',
}

const signedOut: ServiceError = { code: 'signed_out', message: 'Sign in first.' }

const foreignOrigin: ServiceError = {
  code: 'foreign_origin',
  message: 'Changes are accepted from the portal’s own pages only.',
}

export type Answer<Params> = (context: {
  readonly deps: Deps
  readonly actor: Actor
  readonly request: Request
  readonly params: Params
}) => Promise<Response>

/** Wraps a route handler: origin of changes, session, and one place where an unexpected error ends. */
export function handle<Params>(answer: Answer<Params>) {
  return (request: Request, context: { readonly params: Promise<Params> }): Promise<Response> =>
    guarded(async (deps) => {
      const changes = request.method !== 'GET' && request.method !== 'HEAD'
      if (changes && !isSameOrigin(request.headers.get('origin'), container().env.publicUrl)) {
        return problem(foreignOrigin, deps.request.id)
      }
      const actor = await currentActor()
      if (!actor) return problem(signedOut, deps.request.id)
      return answer({ deps, actor, request, params: await context.params })
    })
}

/** Runs the handler of a route that has no session of its own, such as a webhook. */
export async function guarded(answer: (deps: Deps) => Promise<Response>): Promise<Response> {
  const request = await requestInfo()
  try {
    return await answer({ ...container().deps, request })
  } catch (error) {
    container().log.error({ requestId: request.id, error }, 'unexpected error')
    return problem(internal, request.id)
  }
}

/** JSON that holds a client's data: no cache may keep it. */
export function privateJson(value: unknown): Response {
  return Response.json(value, { headers: dataHeaders })
}
