import 'server-only'

import { edgeOf, inDirection } from '@/lib/core/ring/edge-of'
import { findEdge } from '@/lib/core/ring/find-edge'
import { stateLevels } from '@/lib/core/ring/state-levels'
import type { FileStore } from '@/lib/ports/file-store'

import { readSamples } from './channel-samples'
import type { CaptureDto } from './evidence-resource'

/** The first edge is looked for within so many samples from the start. */
const mostSamples = 500_000

/**
 * When the first edge of a channel is half-way between its state levels, in seconds of its file; null where the
 * channel shows no edge.
 */
export async function edgeInstant(
  files: FileStore,
  evidenceId: string,
  channel: number,
  { samples, startSeconds, intervalSeconds }: CaptureDto,
): Promise<number | null> {
  const values = await readSamples(files, evidenceId, channel, 0, Math.min(samples, mostSamples))
  const states = stateLevels(values)
  const span = states === null ? null : findEdge(values, states)
  if (states === null || span === null) return null
  const trace = { values, startSeconds, intervalSeconds }
  return edgeOf(trace, span, inDirection(states, span)).instantSeconds
}
