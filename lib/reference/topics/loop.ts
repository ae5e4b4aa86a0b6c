import { z } from 'zod'

import { coaxialCircles, fluxThroughInnerEdge } from '@/lib/core/inductance/coaxial-circles'
import { conductingRing, thickestRing } from '@/lib/core/inductance/conducting-ring'
import {
  circularLoop,
  circularLoopSecondOrder,
  equivalentRadius,
  rectangularLoop,
} from '@/lib/core/inductance/loop'
import type { Point2 } from '@/lib/core/linear/point'
import { simplePolygon, type Polygon } from '@/lib/core/inductance/polygon'
import {
  conductorFits,
  contourOffsetLoop,
  mutualWithCopy,
  partialSumLoop,
} from '@/lib/core/inductance/polygon-loop'
import {
  rectangleAtMeanDistance,
  rectangleOfBars,
  rectangleOfBarsApproximate,
  rectangleOfSolidWires,
  rectangleOfTubes,
  rectangleRosaGrover,
  wireWithLegs,
} from '@/lib/core/inductance/rectangle-loop'
import { solidMeanDistance } from '@/lib/core/inductance/round-conductor'
import { wireOverPlaneThin } from '@/lib/core/inductance/line'
import { err, ok } from '@/lib/core/result'

import type { Outputs, Topics } from '../topic'
import { finiteTopic, type Answer } from './finite-topic'
import { partialTopics } from './partial'

const positive = z.number().positive()
const polygonSchema = z.object({ points: z.array(z.tuple([z.number(), z.number()])), gmd: positive })

export const loopTopics: Topics = {
  ...partialTopics,
  'loop.circular': finiteTopic(z.object({ radius: positive, wire_radius: positive }), (inputs) => {
    const [a, r] = [inputs.radius, inputs.wire_radius]
    if (r / a > thickestRing) return err('wire_radius: the wire must be thinner than the loop is wide')
    return ok({
      l_surface_thin: circularLoop(a, r, 'surface'),
      l_uniform_thin: circularLoop(a, r, 'uniform'),
      l_uniform_second_order: circularLoopSecondOrder(a, r),
      l_perfect_conductor_exact: conductingRing(a, r),
      l_flux_inner_edge: fluxThroughInnerEdge(a, r),
    })
  }),
  'loop.coaxial_circles_mutual': finiteTopic(
    z.object({ a: positive, b: positive, z: z.number() }),
    ({ a, b, z: apart }) =>
      a === b && apart === 0
        ? err('z: a circle has no finite mutual inductance with itself')
        : ok({ m: coaxialCircles(a, b, apart) }),
  ),
  'loop.rectangular_round_wire': finiteTopic(
    z.object({ width: positive, height: positive, wire_radius: positive }),
    ({ width, height, wire_radius: r }) => {
      if (2 * r >= Math.min(width, height)) return err('wire_radius: opposite sides would touch')
      return ok(roundWireOutputs(width, height, r))
    },
  ),
  'loop.rectangular_flat_trace': finiteTopic(
    z.object({ width: positive, height: positive, trace_width: positive, trace_thickness: positive }),
    ({ width, height, trace_width: w, trace_thickness: t }) => {
      if (w >= Math.min(width, height)) return err('trace_width: opposite sides would touch')
      const rectangle = { width, height }
      return ok({
        l_exact_bars: rectangleOfBars(rectangle, w, t),
        l_gmd: rectangularLoop(width, height, equivalentRadius(w, t), 'surface'),
        l_bar_approx: rectangleOfBarsApproximate(rectangle, w, t),
      })
    },
  ),
  'loop.polygon': finiteTopic(polygonSchema, ({ points, gmd }) =>
    withPolygon(points, gmd, undefined, (polygon) => ({
      l_contour_offset: contourOffsetLoop(polygon, { meanDistance: gmd }),
      l_partial_sum: partialSumLoop(polygon, gmd),
      perimeter: polygon.perimeter,
      area: polygon.area,
    })),
  ),
  'loop.polygon_over_plane': finiteTopic(
    polygonSchema.extend({ height: positive }),
    ({ points, gmd, height }) =>
      withPolygon(points, gmd, height, (polygon) => {
        const free = partialSumLoop(polygon, gmd)
        const image = mutualWithCopy(polygon, 2 * height)
        return {
          l_with_plane: free - image,
          l_free_space: free,
          m_image: image,
          l_with_plane_contour_offset: contourOffsetLoop(polygon, {
            meanDistance: gmd,
            imageDistance: 2 * height,
          }),
        }
      }),
  ),
  'loop.wire_over_plane_with_legs': finiteTopic(
    z.object({ length: positive, height: positive, gmd: positive }),
    ({ length, height, gmd }) => {
      if (gmd >= height) return err('gmd: the wire touches the plane')
      if (2 * gmd >= length) return err('gmd: the legs of the wire touch each other')
      return ok({
        l: wireWithLegs(length, height, gmd),
        l_long_line: length * wireOverPlaneThin(height, gmd),
      })
    },
  ),
  'loop.voltage': finiteTopic(z.object({ l: positive, di: z.number(), dt: positive }), ({ l, di, dt }) =>
    ok({ v: l * (di / dt) }),
  ),
}

function roundWireOutputs(width: number, height: number, r: number): Outputs {
  const rectangle = { width, height }
  return {
    l_grover_uniform: rectangularLoop(width, height, r, 'uniform'),
    l_grover_surface: rectangularLoop(width, height, r, 'surface'),
    l_rosa_grover_with_2r_term: rectangleRosaGrover(rectangle, r),
    l_exact_partials_uniform: rectangleOfSolidWires(rectangle, r),
    l_exact_partials_surface: rectangleOfTubes(rectangle, r),
    l_gmd_filament_sum: rectangleAtMeanDistance(rectangle, solidMeanDistance(r)),
  }
}

/** Answers for points that make a simple polygon, and a conductor that fits it. */
function withPolygon(
  points: readonly Point2[],
  gmd: number,
  height: number | undefined,
  answer: (polygon: Polygon) => Outputs,
): Answer {
  const polygon = simplePolygon(points)
  if (!polygon.ok) return polygon
  const fits = conductorFits(polygon.value, gmd, height)
  return fits.ok ? ok(answer(polygon.value)) : fits
}
