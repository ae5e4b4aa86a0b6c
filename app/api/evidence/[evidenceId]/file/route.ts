import { attachment } from '@/lib/server/attachment'
import { handle, problem } from '@/lib/server/http'
import { evidence } from '@/lib/server/operations'

/** The bytes as they were sent in. */
export const GET = handle<{ readonly evidenceId: string }>(async ({ deps, actor, params }) => {
  const opened = await evidence.openEvidenceFile.execute(deps, actor, { evidenceId: params.evidenceId })
  return opened.ok ? attachment(opened.value) : problem(opened.error, deps.request.id)
})
