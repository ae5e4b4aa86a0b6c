import type { UploadState } from './upload-state'
import { z } from '../shell/plain-zod'

const received = z.object({
  evidenceId: z.string(),
  status: z.enum(['ready', 'refused']),
  refusal: z.string().nullable(),
})

const problem = z.object({ title: z.string() })

const connectionLost =
  'The connection broke off, so nothing of this file was kept. Check the network, then send it again.'

const routeFor = (engagementId: string) => `/api/evidence/upload/${engagementId}`

/** Asks whether the file would be taken in, then sends it; `report` hears of every step. */
export async function sendFile(
  engagementId: string,
  file: File,
  report: (state: UploadState) => void,
): Promise<void> {
  const refusal = await announce(engagementId, file)
  if (refusal !== null) return report(refusal)
  report(await put(engagementId, file, report))
}

async function announce(engagementId: string, file: File): Promise<UploadState | null> {
  try {
    const answer = await fetch(routeFor(engagementId), {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ name: file.name, sizeBytes: file.size }),
    })
    return answer.ok ? null : { phase: 'refused', message: sentenceOf(await answer.text()), evidenceId: null }
  } catch {
    return { phase: 'failed', message: connectionLost }
  }
}

/** By XMLHttpRequest, because fetch tells nothing of how far an upload has come. */
function put(engagementId: string, file: File, report: (state: UploadState) => void): Promise<UploadState> {
  return new Promise((resolve) => {
    const request = new XMLHttpRequest()
    const startedAt = Date.now()
    request.open('PUT', routeFor(engagementId))
    request.setRequestHeader('x-file-name', encodeURIComponent(file.name))
    request.upload.onprogress = ({ loaded }) =>
      report({ phase: 'sending', sentBytes: loaded, startedAt, now: Date.now() })
    request.upload.onload = () => report({ phase: 'checking' })
    request.onload = () => resolve(outcomeOf(request))
    request.onerror = () => resolve({ phase: 'failed', message: connectionLost })
    request.onabort = () => resolve({ phase: 'failed', message: connectionLost })
    request.send(file)
  })
}

function outcomeOf(request: XMLHttpRequest): UploadState {
  if (request.status !== 200) {
    return { phase: 'refused', message: sentenceOf(request.responseText), evidenceId: null }
  }
  const answer = received.safeParse(jsonOf(request.responseText))
  if (!answer.success)
    return { phase: 'failed', message: 'The portal gave no usable answer. Send the file again.' }
  const { evidenceId, refusal } = answer.data
  return refusal === null ? { phase: 'done', evidenceId } : { phase: 'refused', message: refusal, evidenceId }
}

function sentenceOf(body: string): string {
  const parsed = problem.safeParse(jsonOf(body))
  return parsed.success ? parsed.data.title : 'The portal refused the file without a reason. Try again.'
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return null
  }
}
