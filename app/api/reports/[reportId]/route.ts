import { attachment } from '@/lib/server/attachment'
import { handle, problem } from '@/lib/server/http'
import { reportReading } from '@/lib/server/operations'

/** The report's file: signed for the client, as far as it has come for its consultants. */
export const GET = handle<{ readonly reportId: string }>(async ({ deps, actor, params }) => {
  const opened = await reportReading.openReportFile.execute(deps, actor, { reportId: params.reportId })
  return opened.ok
    ? attachment({ ...opened.value, mediaType: 'application/pdf' })
    : problem(opened.error, deps.request.id)
})
