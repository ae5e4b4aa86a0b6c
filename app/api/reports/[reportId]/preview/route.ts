import { attachment } from '@/lib/server/attachment'
import { handle, problem } from '@/lib/server/http'
import { reportReading } from '@/lib/server/operations'

/** The frozen content as a PDF before it is signed, for author and reviewer. */
export const GET = handle<{ readonly reportId: string }>(async ({ deps, actor, params }) => {
  const opened = await reportReading.previewReport.execute(deps, actor, { reportId: params.reportId })
  return opened.ok
    ? attachment({ ...opened.value, mediaType: 'application/pdf' })
    : problem(opened.error, deps.request.id)
})
