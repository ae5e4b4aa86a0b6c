import { z } from 'zod'

import { err, ok } from '@/lib/core/result'
import { nodeRiseTime, switchEdge } from '@/lib/core/snubber/switched-edge'

import { finiteTopic } from './finite-topic'

const positive = z.number().positive()

const schema = z.object({
  v_step: z.number(),
  v_initial: z.number().default(0),
  l: positive,
  c_par: positive,
  r_series: z.number().min(0),
  edge_time_0_100: z.number().min(0),
  f_rep: positive,
  rs: positive.optional(),
  cs: positive.optional(),
})

/** One edge of the switch node with or without its snubber, and two of them a period. */
export const edgeResponseTopic = finiteTopic(schema, (inputs) => {
  const { v_step: step, l, c_par, r_series, edge_time_0_100: duration, f_rep, rs, cs } = inputs
  if ((rs === undefined) !== (cs === undefined)) return err('rs, cs: a snubber has both')
  if (step === 0) return err('v_step: a step of nothing has no response')
  const snubber = rs === undefined || cs === undefined ? undefined : { resistance: rs, capacitance: cs }
  if (r_series === 0 && snubber === undefined)
    return err('r_series: without any resistance the ring never ends')
  const node = {
    inductance: l,
    capacitance: c_par,
    seriesResistance: r_series,
    ...(snubber === undefined ? {} : { snubber }),
  }
  const edge = { from: inputs.v_initial, step, duration }
  const outcome = switchEdge(node, edge)
  const total = outcome.seriesEnergy + outcome.snubberEnergy
  const perSecond = 2 * f_rep
  const rulePerFarad = step ** 2 * f_rep
  return ok({
    peak: outcome.peak,
    overshoot_fraction: outcome.overshoot,
    rise_time_10_90: nodeRiseTime(node, edge),
    damping_ratio_min: outcome.dampingRatio,
    ...(outcome.ringFrequency === null ? {} : { ring_frequency_damped: outcome.ringFrequency }),
    E_R: outcome.seriesEnergy,
    energy_total_per_edge: total,
    power_total: total * perSecond,
    power_rule_cs_v2_f: (cs ?? 0) * rulePerFarad,
    power_rule_cs_plus_cpar: ((cs ?? 0) + c_par) * rulePerFarad,
    ...(rs === undefined
      ? {}
      : {
          E_Rs: outcome.snubberEnergy,
          power_rs: outcome.snubberEnergy * perSecond,
          i_snub_peak: outcome.snubberPeakCurrent,
          i_snub_rms: Math.sqrt((outcome.snubberEnergy * perSecond) / rs),
        }),
  })
})
