import 'server-only'

import { listEvidenceOf } from '@/db/repositories/evidence.repo'
import type { Actor } from '@/lib/authz/actor'
import { notFound, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { compareCapturesSchema } from './compare-captures.schema'
import { edgeInstant } from './edge-instant'
import { evidenceFor, loadCapture, type CaptureDto } from './evidence-resource'
import { noSuchChannel, notACapture, type EvidenceError } from './evidence.errors'
import { engagementIdSchema } from './evidence.schema'

export type ComparedCapture = {
  readonly evidenceId: string
  readonly number: number
  readonly name: string
  readonly extent: { readonly from: number; readonly to: number }
  readonly channels: readonly { readonly position: number; readonly name: string; readonly unit: string }[]
  /** Half-way through the first edge of the chosen channel; null where there is none. */
  readonly edgeSeconds: number | null
}

/** Two captures of one engagement, with the edges by which one is laid over the other. */
export const compareCaptures = operation(
  'evidence.compareCaptures',
  compareCapturesSchema,
  async (deps, actor, input) => {
    const first = await comparedCapture(deps, actor, input.first, input.firstChannel)
    if (!first.ok) return first
    const second = await comparedCapture(deps, actor, input.second, input.secondChannel)
    if (!second.ok) return second
    if (first.value.engagementId !== second.value.engagementId) return err(notFound)
    const [one, other] = [first.value.capture, second.value.capture]
    const isAligned = one.edgeSeconds !== null && other.edgeSeconds !== null
    return ok({
      engagementId: first.value.engagementId,
      first: one,
      second: other,
      isAligned,
      shiftSeconds: (other.edgeSeconds ?? 0) - (one.edgeSeconds ?? 0),
    })
  },
)

/** The captures of an engagement that can be laid over each other. */
export const listComparable = operation(
  'evidence.listComparable',
  engagementIdSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'evidence.read', input.engagementId)
    if (!engagement.ok) return engagement
    const captures = []
    for (const { id, number, name } of await listEvidenceOf(deps.db, input.engagementId)) {
      const capture = await loadCapture(deps.db, id)
      if (!capture) continue
      const channels = capture.channels.map(({ position, name: channel, unit }) => ({
        position,
        name: channel,
        unit,
      }))
      captures.push({ evidenceId: id, number, name, extent: extentOf(capture), channels })
    }
    return ok(captures)
  },
)

type Loaded = { readonly engagementId: string; readonly capture: ComparedCapture }

async function comparedCapture(
  deps: Deps,
  actor: Actor,
  evidenceId: string,
  channel: number,
): Promise<Result<Loaded, EvidenceError | Denial>> {
  const evidence = await evidenceFor(deps.db, actor, 'evidence.read', evidenceId)
  if (!evidence.ok) return evidence
  const capture = await loadCapture(deps.db, evidenceId)
  if (!capture) return err(notACapture)
  if (!capture.channels[channel]) return err(noSuchChannel(channel))
  const { row } = evidence.value
  return ok({
    engagementId: row.engagement_id,
    capture: {
      evidenceId,
      number: row.number,
      name: row.name,
      extent: extentOf(capture),
      channels: capture.channels.map(({ position, name, unit }) => ({ position, name, unit })),
      edgeSeconds: await edgeInstant(deps.files, evidenceId, channel, capture),
    },
  })
}

const extentOf = ({ startSeconds, samples, intervalSeconds }: CaptureDto) => ({
  from: startSeconds,
  to: startSeconds + (samples - 1) * intervalSeconds,
})
