import { z } from 'zod'

import {
  nearestByDifference,
  nearestByRatio,
  neighboursOf,
  seriesNames,
} from '@/lib/core/parts/preferred-values'
import { ok } from '@/lib/core/result'

import type { Topics } from '../topic'
import { finiteTopic } from './finite-topic'

export const partsTopics: Topics = {
  'parts.e_series': finiteTopic(
    z.object({ value: z.number().min(1e-24).max(1e24), series: z.enum(seriesNames) }),
    ({ value, series }) => {
      const { below, above } = neighboursOf(value, series)
      return ok({
        nearest_ratio: nearestByRatio(value, series),
        nearest_absolute: nearestByDifference(value, series),
        next_up: above,
        next_down: below,
      })
    },
  ),
}
