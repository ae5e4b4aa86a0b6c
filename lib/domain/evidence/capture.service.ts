import 'server-only'

import { err, ok } from '@/lib/core/result'

import { operation } from '../operation'
import { captureChannelFor } from './capture-channel'
import { readPoints } from './capture-points'
import { noSuchChannel, unitsDiffer } from './evidence.errors'
import { capturePointsSchema } from './evidence.schema'

/** One channel between two instants, decimated to the lowest and highest sample of each of `buckets` columns. */
export const capturePoints = operation(
  'evidence.capturePoints',
  capturePointsSchema,
  async (deps, actor, input) => {
    const found = await captureChannelFor(deps.db, actor, input.evidenceId, input.channel)
    if (!found.ok) return found
    const { capture, channel } = found.value
    if (input.minus !== undefined) {
      const other = capture.channels[input.minus]
      if (!other) return err(noSuchChannel(input.minus))
      if (other.unit !== channel.unit) return err(unitsDiffer(channel.name, other.name))
    }
    return ok(await readPoints(deps.files, input, capture))
  },
)
