import { json, type FakeReply } from '../http-server'

export const refusal = (status: number, type: string, message: string, code?: string): FakeReply =>
  json(status, { error: { type, message, ...(code === undefined ? {} : { code }) } })

export const badRequest = (message: string) =>
  refusal(400, 'invalid_request_error', message, 'parameter_invalid')

export const noSuch = (id: string) =>
  refusal(404, 'invalid_request_error', `No such object: ${id}`, 'resource_missing')

export const keyClash = () =>
  refusal(
    400,
    'idempotency_error',
    'This idempotency key was used with other parameters before. Use a key for one request only.',
  )

type Listed = { readonly id: string; readonly created: number }

/** A page of a list, newest first, as `limit`, `starting_after` and `created[gte]` ask for. */
export function listReply(url: URL, rows: readonly Listed[]): FakeReply {
  const limit = Number(url.searchParams.get('limit') ?? 10)
  const since = Number(url.searchParams.get('created[gte]') ?? 0)
  const after = url.searchParams.get('starting_after')
  const newestFirst = rows.filter((row) => row.created >= since).reverse()
  const start = after === null ? 0 : newestFirst.findIndex((row) => row.id === after) + 1
  const data = newestFirst.slice(start, start + limit)
  return json(200, {
    object: 'list',
    url: url.pathname,
    has_more: start + limit < newestFirst.length,
    data,
  })
}
