import { z } from 'zod'

import { barMutual, barSelf, barSelfApproximate } from '@/lib/core/inductance/bar'
import { filamentMutual } from '@/lib/core/inductance/filament-mutual'
import { areOverlapping, parallelFilaments } from '@/lib/core/inductance/parallel-filaments'
import { err, ok } from '@/lib/core/result'

import type { Topics } from '../topic'
import { finiteTopic } from './finite-topic'

const positive = z.number().positive()
const point = z.tuple([z.number(), z.number(), z.number()])

const parallelSchema = z.object({
  l1: positive,
  l2: positive,
  distance: z.number().nonnegative(),
  axial_offset: z.number(),
})

const skewSchema = z.object({ a_start: point, a_end: point, b_start: point, b_end: point })

const barSchema = z.object({ width: positive, thickness: positive, length: positive })

const barPairSchema = z.object({
  w1: positive,
  t1: positive,
  l1: positive,
  w2: positive,
  t2: positive,
  l2: positive,
  x_offset: z.number(),
  y_offset: z.number(),
  z_offset: z.number(),
})

export const partialTopics: Topics = {
  'partial.parallel_filaments': finiteTopic(parallelSchema, ({ l1, l2, distance, axial_offset }) => {
    const pair = { length1: l1, length2: l2, distance, offset: axial_offset }
    return areOverlapping(pair)
      ? err('distance: filaments that overlap on one line have no finite mutual inductance')
      : ok({ m: parallelFilaments(pair) })
  }),
  'partial.skew_segments': finiteTopic(skewSchema, ({ a_start, a_end, b_start, b_end }) => {
    const mutual = filamentMutual({ start: a_start, end: a_end }, { start: b_start, end: b_end })
    return mutual.ok ? ok({ m: mutual.value }) : mutual
  }),
  'partial.bar_self': finiteTopic(barSchema, (bar) =>
    ok({ l_exact: barSelf(bar), l_rosa_grover: barSelfApproximate(bar) }),
  ),
  'partial.bar_mutual': finiteTopic(barPairSchema, (inputs) => {
    const first = { width: inputs.w1, thickness: inputs.t1, length: inputs.l1 }
    const second = { width: inputs.w2, thickness: inputs.t2, length: inputs.l2 }
    const offset = { across: inputs.x_offset, up: inputs.y_offset, along: inputs.z_offset }
    return ok({ m: barMutual(first, second, offset) })
  }),
}
