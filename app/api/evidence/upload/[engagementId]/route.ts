import { handle, privateJson, problem } from '@/lib/server/http'
import { uploads } from '@/lib/server/operations'
import { announcementOf, uploadOf } from '@/lib/server/upload'

type Params = { readonly engagementId: string }

/** Says beforehand whether a file would be taken in: `{ name, sizeBytes }`. */
export const POST = handle<Params>(async ({ deps, actor, request, params }) => {
  const input = { engagementId: params.engagementId, ...(await announcementOf(request)) }
  const announced = await uploads.announceUpload.execute(deps, actor, input)
  return announced.ok ? privateJson(announced.value) : problem(announced.error, deps.request.id)
})

/** Takes one file in: the raw body, its name percent-encoded in `x-file-name`. The Content-Type plays no part. */
export const PUT = handle<Params>(async ({ deps, actor, request, params }) => {
  const input = { engagementId: params.engagementId, ...uploadOf(request) }
  const received = await uploads.receiveEvidence.execute(deps, actor, input)
  return received.ok ? privateJson(received.value) : problem(received.error, deps.request.id)
})
