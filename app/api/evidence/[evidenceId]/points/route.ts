import { handle, privateJson, problem } from '@/lib/server/http'
import { captures } from '@/lib/server/operations'

/** One channel of a capture between two instants: `?channel=0&from=0&to=1e-6&buckets=1000`. */
export const GET = handle<{ readonly evidenceId: string }>(async ({ deps, actor, request, params }) => {
  const wanted = Object.fromEntries(new URL(request.url).searchParams)
  const points = await captures.capturePoints.execute(deps, actor, {
    ...wanted,
    evidenceId: params.evidenceId,
  })
  return points.ok ? privateJson(points.value) : problem(points.error, deps.request.id)
})
