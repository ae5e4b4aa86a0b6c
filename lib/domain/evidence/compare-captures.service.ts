import 'server-only'

import type { Actor } from '@/lib/authz/actor'
import { notFound, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { captureChannelFor, offeredCapture, offeredCaptures, type OfferedCapture } from './capture-channel'
import { compareCapturesSchema } from './compare-captures.schema'
import { edgeInstant } from './edge-instant'
import type { EvidenceError } from './evidence.errors'
import { engagementIdSchema } from './evidence.schema'

export type ComparedCapture = OfferedCapture & {
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
    return ok(await offeredCaptures(deps.db, input.engagementId))
  },
)

type Loaded = { readonly engagementId: string; readonly capture: ComparedCapture }

async function comparedCapture(
  deps: Deps,
  actor: Actor,
  evidenceId: string,
  channel: number,
): Promise<Result<Loaded, EvidenceError | Denial>> {
  const found = await captureChannelFor(deps.db, actor, evidenceId, channel)
  if (!found.ok) return found
  const { row, capture } = found.value
  const edgeSeconds = await edgeInstant(deps.files, evidenceId, channel, capture)
  return ok({ engagementId: row.engagement_id, capture: { ...offeredCapture(row, capture), edgeSeconds } })
}
