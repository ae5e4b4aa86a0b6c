import { z } from 'zod'

import { coplanarPair, coplanarPairUniform } from '@/lib/core/inductance/coplanar-pair'
import {
  roundPair,
  roundPairThin,
  roundPairUniform,
  stripOverPlane,
  wideStripOverPlane,
  wireOverPlane,
  wireOverPlaneThin,
} from '@/lib/core/inductance/line'
import { stripOverPlaneExact } from '@/lib/core/inductance/strip-solution'
import { stripOverPlaneWidened, thickStripOverPlane } from '@/lib/core/inductance/thick-strip'
import { err, ok } from '@/lib/core/result'

import type { Topics } from '../topic'
import { finiteTopic } from './finite-topic'

const positive = z.number().positive()
const stripSchema = z.object({ width: positive, height: positive })

export const lineTopics: Topics = {
  'line.microstrip_inductance': finiteTopic(stripSchema, ({ width, height }) =>
    ok({
      lp_exact_thin: stripOverPlaneExact(width, height),
      lp_hammerstad_jensen: stripOverPlane(width, height),
      lp_wide_plate: wideStripOverPlane(width, height),
    }),
  ),
  'line.microstrip_inductance_thick': finiteTopic(
    stripSchema.extend({ thickness: positive }),
    ({ width, height, thickness }) => {
      const solved = thickStripOverPlane(width, height, thickness)
      return solved === null
        ? err('thickness: the field around this section has no solution in numbers')
        : ok({
            lp_bem: solved,
            lp_hj_thickness_corrected: stripOverPlaneWidened(width, height, thickness),
          })
    },
  ),
  'line.coplanar_pair': finiteTopic(z.object({ width1: positive, width2: positive, gap: positive }), (pair) =>
    ok({ lp_hf: coplanarPair(pair), lp_uniform_current: coplanarPairUniform(pair) }),
  ),
  'line.round_pair': finiteTopic(z.object({ spacing: positive, radius: positive }), ({ spacing, radius }) =>
    spacing > 2 * radius
      ? ok({
          lp_hf_exact: roundPair(spacing, radius),
          lp_thin: roundPairThin(spacing, radius),
          lp_uniform_current: roundPairUniform(spacing, radius),
        })
      : err('spacing: the wires must not touch, spacing is more than two radii'),
  ),
  'line.round_wire_over_plane': finiteTopic(
    z.object({ height_centre: positive, radius: positive }),
    ({ height_centre, radius }) =>
      height_centre > radius
        ? ok({
            lp_hf_exact: wireOverPlane(height_centre, radius),
            lp_thin: wireOverPlaneThin(height_centre, radius),
          })
        : err('height_centre: the wire must not touch the plane, its centre is higher than its radius'),
  ),
}
