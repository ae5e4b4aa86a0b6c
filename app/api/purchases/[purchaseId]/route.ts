import { handle, privateJson, problem } from '@/lib/server/http'
import { purchases } from '@/lib/server/operations'

/** How a purchase stands; the return page asks until the hours are credited. */
export const GET = handle<{ readonly purchaseId: string }>(async ({ deps, actor, params }) => {
  const status = await purchases.purchaseStatus.execute(deps, actor, { purchaseId: params.purchaseId })
  return status.ok ? privateJson(status.value) : problem(status.error, deps.request.id)
})
