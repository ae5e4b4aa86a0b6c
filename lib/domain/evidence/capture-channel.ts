import 'server-only'

import type { Db } from '@/db/client'
import { listEvidenceOf, type EvidenceRow } from '@/db/repositories/evidence.repo'
import type { Actor } from '@/lib/authz/actor'
import type { Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import { evidenceFor, loadCapture, type CaptureDto } from './evidence-resource'
import { noSuchChannel, notACapture, type EvidenceError } from './evidence.errors'

export type CaptureChannel = {
  readonly row: EvidenceRow
  readonly capture: CaptureDto
  readonly channel: CaptureDto['channels'][number]
}

/** One channel of a capture that the actor may read. */
export async function captureChannelFor(
  db: Db,
  actor: Actor,
  evidenceId: string,
  position: number,
): Promise<Result<CaptureChannel, EvidenceError | Denial>> {
  const evidence = await evidenceFor(db, actor, 'evidence.read', evidenceId)
  if (!evidence.ok) return evidence
  const capture = await loadCapture(db, evidenceId)
  if (!capture) return err(notACapture)
  const channel = capture.channels[position]
  return channel ? ok({ row: evidence.value.row, capture, channel }) : err(noSuchChannel(position))
}

/** A capture as it is offered to be measured or compared. */
export type OfferedCapture = {
  readonly evidenceId: string
  readonly number: number
  readonly name: string
  /** Its first and last instant, in seconds. */
  readonly extent: { readonly from: number; readonly to: number }
  readonly channels: readonly { readonly position: number; readonly name: string; readonly unit: string }[]
}

type Named = Pick<EvidenceRow, 'id' | 'number' | 'name'>

export const offeredCapture = ({ id, number, name }: Named, capture: CaptureDto): OfferedCapture => ({
  evidenceId: id,
  number,
  name,
  extent: {
    from: capture.startSeconds,
    to: capture.startSeconds + (capture.samples - 1) * capture.intervalSeconds,
  },
  channels: capture.channels.map((channel) => ({
    position: channel.position,
    name: channel.name,
    unit: channel.unit,
  })),
})

/** Every capture of an engagement that was read. The caller has asked the policy. */
export async function offeredCaptures(db: Db, engagementId: string): Promise<readonly OfferedCapture[]> {
  const captures: OfferedCapture[] = []
  for (const row of await listEvidenceOf(db, engagementId)) {
    const capture = await loadCapture(db, row.id)
    if (capture) captures.push(offeredCapture(row, capture))
  }
  return captures
}
