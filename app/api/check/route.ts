import { guarded, privateJson, problem } from '@/lib/server/http'
import { reportCheck } from '@/lib/server/operations'
import { readBody } from '@/lib/server/read-body'

/** Checks a report that somebody holds. The body is looked at in memory and kept nowhere. */
export const POST = (request: Request): Promise<Response> =>
  guarded(async (deps) => {
    const body = await readBody(request, reportCheck.largestCheckedFile)
    if (!body.ok) return problem(body.error, deps.request.id)
    const checked = await reportCheck.checkFile.execute(deps, { bytes: body.value })
    return checked.ok ? privateJson(checked.value) : problem(checked.error, deps.request.id)
  })
