import 'server-only'

import { insertEvidence } from '@/db/repositories/evidence.repo'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import type { Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'
import type { StoredFile, StoreError } from '@/lib/ports/file-store'

import type { Deps } from '../deps'
import { engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { admitUpload, roomFor, type AdmittedUpload } from './admit-upload'
import { checkCapture } from './check-capture'
import { interrupted, lengthMismatch, noSpace, type EvidenceError } from './evidence.errors'
import { announceUploadSchema, receiveEvidenceSchema } from './evidence.schema'
import { inspectContent } from './inspect-content'

export type ReceivedEvidence = {
  readonly evidenceId: string
  readonly number: number
  readonly name: string
  readonly status: 'ready' | 'refused'
  readonly refusal: string | null
}

/** Says whether a file would be taken in, before any of it is sent. */
export const announceUpload = operation(
  'evidence.announceUpload',
  announceUploadSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'evidence.add', input.engagementId)
    if (!engagement.ok) return engagement
    const admitted = admitUpload(input.name, input.sizeBytes, deps.settings.uploadLimitBytes)
    if (!admitted.ok) return admitted
    const room = await roomFor(deps.db, input.engagementId, input.sizeBytes)
    return room.ok ? ok({ name: admitted.value.name }) : room
  },
)

/**
 * Takes a file in: judged by name and length first, streamed to the store while it is hashed, then judged by its
 * content, then entered; a capture is read at once. What is not entered leaves no byte behind.
 */
export const receiveEvidence = operation(
  'evidence.receiveEvidence',
  receiveEvidenceSchema,
  async (deps, actor, input): Promise<Result<ReceivedEvidence, EvidenceError | Denial>> => {
    const engagement = await engagementFor(deps.db, actor, 'evidence.add', input.engagementId)
    if (!engagement.ok) return engagement
    const admitted = admitUpload(input.name, input.contentLength, deps.settings.uploadLimitBytes)
    if (!admitted.ok) return admitted
    const room = await roomFor(deps.db, input.engagementId, admitted.value.sizeBytes)
    if (!room.ok) return room
    const id = deps.ids.newId()
    const stored = await storeWhole(deps, id, input.body, admitted.value)
    if (!stored.ok) return stored
    const entered = await enterOrRemove(deps, actor, {
      id,
      engagementId: input.engagementId,
      upload: admitted.value,
      stored: stored.value,
    })
    if (!entered.ok) return entered
    const outcome =
      admitted.value.kind.kind === 'capture'
        ? await checkCapture(deps, id)
        : { status: 'ready' as const, refusal: null }
    return ok({ evidenceId: id, number: entered.value.number, name: admitted.value.name, ...outcome })
  },
)

async function storeWhole(
  deps: Deps,
  id: string,
  body: ReadableStream<Uint8Array>,
  upload: AdmittedUpload,
): Promise<Result<StoredFile, EvidenceError>> {
  const stored = await deps.files.write(id, body, upload.sizeBytes)
  if (!stored.ok) return err(sentenceFor(stored.error, upload.sizeBytes))
  if (stored.value.sizeBytes === upload.sizeBytes) return stored
  await deps.files.remove(id)
  return err(lengthMismatch(upload.sizeBytes))
}

function sentenceFor(error: StoreError, announcedBytes: number): EvidenceError {
  switch (error.code) {
    case 'too_large':
      return lengthMismatch(announcedBytes)
    case 'interrupted':
      return interrupted
    case 'no_space':
      return noSpace
  }
}

type NewEvidence = {
  readonly id: string
  readonly engagementId: string
  readonly upload: AdmittedUpload
  readonly stored: StoredFile
}

async function enterOrRemove(
  deps: Deps,
  actor: Actor,
  evidence: NewEvidence,
): Promise<Result<{ readonly number: number }, EvidenceError | Denial>> {
  const { id, upload, stored } = evidence
  let isEntered = false
  try {
    const content = await inspectContent(deps.files, id, stored.sizeBytes, upload.extension, upload.kind)
    if (!content.ok) return content
    const entered = await enter(deps, actor, evidence)
    isEntered = entered.ok
    return entered
  } finally {
    if (!isEntered) await deps.files.remove(id)
  }
}

/** A long upload may outlast the right to send it or the room for it, so both are asked again with the row. */
function enter(deps: Deps, actor: Actor, { id, engagementId, upload, stored }: NewEvidence) {
  return withTx(deps.db, async (tx): Promise<Result<{ readonly number: number }, EvidenceError | Denial>> => {
    const engagement = await engagementFor(tx, actor, 'evidence.add', engagementId)
    if (!engagement.ok) return engagement
    const room = await roomFor(tx, engagementId, stored.sizeBytes)
    if (!room.ok) return room
    await insertEvidence(tx, {
      id,
      engagement_id: engagementId,
      number: room.value.number,
      name: upload.name,
      kind: upload.kind.kind,
      media_type: upload.kind.mediaType,
      size_bytes: stored.sizeBytes,
      sha256: stored.sha256,
      status: upload.kind.kind === 'capture' ? 'checking' : 'ready',
      refusal: null,
      uploaded_by: actor.personId,
      created_at: deps.clock.now(),
    })
    return room
  })
}
