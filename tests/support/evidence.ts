import type { Actor } from '@/lib/authz/actor'
import { receiveEvidence } from '@/lib/domain/evidence/upload.service'

import type { TestEngagement } from './engagement'
import { bytesOf, captureText, streamOf } from './sample-files'
import type { TestPortal } from './test-portal'
import { valueOf } from './value-of'

export type SentFile = {
  readonly name: string
  readonly bytes: Uint8Array
  /** The announced length, where it is not the true one. */
  readonly announced?: number | null
  readonly body?: ReadableStream<Uint8Array>
}

/** Sends a file as the route would; by the engineer of the engagement unless somebody else is named. */
export function sendEvidence(
  portal: TestPortal,
  engagement: TestEngagement,
  { name, bytes, announced = bytes.byteLength, body }: SentFile,
  actor: Actor = engagement.engineer,
) {
  return receiveEvidence.execute(portal.deps, actor, {
    engagementId: engagement.engagementId,
    name,
    contentLength: announced,
    body: body ?? streamOf(bytes),
  })
}

/** Takes a capture in and returns what became of it. */
export async function sendCapture(portal: TestPortal, engagement: TestEngagement, text = captureText()) {
  return valueOf(await sendEvidence(portal, engagement, { name: 'sw-node.csv', bytes: bytesOf(text) }))
}
