import 'server-only'

import { err, ok } from '@/lib/core/result'

import { operation } from '../operation'
import { readPoints } from './capture-points'
import { evidenceFor, loadCapture } from './evidence-resource'
import { noSuchChannel, notACapture, unitsDiffer } from './evidence.errors'
import { capturePointsSchema } from './evidence.schema'

/** One channel between two instants, decimated to the lowest and highest sample of each of `buckets` columns. */
export const capturePoints = operation(
  'evidence.capturePoints',
  capturePointsSchema,
  async (deps, actor, input) => {
    const evidence = await evidenceFor(deps.db, actor, 'evidence.read', input.evidenceId)
    if (!evidence.ok) return evidence
    const capture = await loadCapture(deps.db, input.evidenceId)
    if (!capture) return err(notACapture)
    const channel = capture.channels[input.channel]
    if (!channel) return err(noSuchChannel(input.channel))
    if (input.minus !== undefined) {
      const other = capture.channels[input.minus]
      if (!other) return err(noSuchChannel(input.minus))
      if (other.unit !== channel.unit) return err(unitsDiffer(channel.name, other.name))
    }
    return ok(await readPoints(deps.files, input, capture))
  },
)
