import { z } from 'zod'

import { longTubeSelf, solidRoundSelf, tubeSelf } from '@/lib/core/inductance/round-conductor'
import { planeSpreading, viaPair, viaPairThin, viaWithReturns } from '@/lib/core/inductance/via'
import { viaArray } from '@/lib/core/inductance/via-array'
import { viaFluxToSurface, viaMicrostripFit, viaPopular } from '@/lib/core/inductance/via-partial'
import { err, ok } from '@/lib/core/result'

import type { Topics } from '../topic'
import { finiteTopic } from './finite-topic'

const positive = z.number().positive()
const viaSchema = z.object({ length: positive, diameter: positive })

const returnsSchema = z.object({
  height: positive,
  radius_of_returns: positive,
  diameter: positive,
  n_returns: z.int().positive(),
})

export const viaTopics: Topics = {
  'via.partial_self': finiteTopic(viaSchema, ({ length, diameter }) =>
    ok({
      l_tube_exact: tubeSelf(length, diameter / 2),
      l_tube_long: longTubeSelf(length, diameter / 2),
      l_flux_to_surface: viaFluxToSurface(length, diameter / 2),
      l_solid_exact: solidRoundSelf(length, diameter / 2),
      l_popular_plus_one: viaPopular(length, diameter),
      l_three_halves: viaMicrostripFit(length, diameter / 2),
    }),
  ),
  'via.pair_between_planes': finiteTopic(
    z.object({ height: positive, spacing: positive, diameter: positive }),
    ({ height, spacing, diameter }) =>
      spacing > diameter
        ? ok({
            l_exact: viaPair(height, spacing, diameter),
            l_thin: viaPairThin(height, spacing, diameter),
          })
        : err('spacing: the vias must not touch, spacing is more than the diameter'),
  ),
  'via.signal_with_n_returns': finiteTopic(returnsSchema, (inputs) => {
    const { height, radius_of_returns: radius, diameter, n_returns: count } = inputs
    if (radius <= diameter) return err('radius_of_returns: the returns must not touch the signal via')
    const apart = count === 1 ? Number.POSITIVE_INFINITY : 2 * radius * Math.sin(Math.PI / count)
    if (apart <= diameter) return err('n_returns: so many vias do not fit on this circle, they would touch')
    return ok({ l: viaWithReturns(height, radius, diameter, count) })
  }),
  'via.parallel_array_partial': finiteTopic(
    viaSchema.extend({
      positions: z
        .array(z.tuple([z.number(), z.number()]))
        .min(1)
        .max(1000),
    }),
    (array) => {
      const answer = viaArray(array)
      if (!answer.ok) return answer
      return ok({
        l_effective: answer.value.effective,
        l_single: answer.value.single,
        ratio_to_single_over_n: answer.value.ratioToShare,
        current_shares: answer.value.shares,
      })
    },
  ),
  'plane.radial_spreading': finiteTopic(
    z.object({ height: positive, via_radius: positive, outer_radius: positive }),
    ({ height, via_radius, outer_radius }) =>
      outer_radius > via_radius
        ? ok({ l: planeSpreading(height, outer_radius, via_radius) })
        : err('outer_radius: the ring must be outside the via'),
  ),
}
