import { z } from 'zod'

import { interruptOptimum } from '@/lib/core/snubber/current-interrupt'
import { leastDamping } from '@/lib/core/snubber/modes'
import { characteristicImpedance } from '@/lib/core/snubber/network'
import {
  allRealInterval,
  leastOvershootResistance,
  mostDampingResistance,
  overshootOf,
  withSnubber,
} from '@/lib/core/snubber/optimum'
import { decrementOf, naturalFrequency, parasiticsFromShift } from '@/lib/core/snubber/parasitics'
import { settledEdgeLoss, squareWaveLoss } from '@/lib/core/snubber/rc-loss'
import { clampCapacitance, clampDuty } from '@/lib/core/snubber/rcd-clamp'
import { err, ok } from '@/lib/core/result'

import type { Topics } from '../topic'
import { edgeResponseTopic } from './edge-response'
import { finiteTopic } from './finite-topic'

const positive = z.number().positive()
const ratioBelowOne = z.number().min(0).lt(1)
const noShift = 'f1: an added capacitance lowers the ring, so f1 must be below f0'

export const snubberTopics: Topics = {
  'snubber.parasitics_two_freq': finiteTopic(
    z.object({ f0: positive, f1: positive, c_add: positive }),
    ({ f0, f1, c_add }) => {
      const found = parasiticsFromShift(f0, f1, c_add)
      return found.ok ? ok(parasiticOutputs(found.value)) : err(noShift)
    },
  ),
  'snubber.parasitics_two_freq_damped': finiteTopic(
    z.object({
      f0_damped: positive,
      zeta0: ratioBelowOne,
      f1_damped: positive,
      zeta1: ratioBelowOne,
      c_add: positive,
    }),
    ({ f0_damped, zeta0, f1_damped, zeta1, c_add }) => {
      const bare = naturalFrequency(f0_damped, zeta0)
      const loaded = naturalFrequency(f1_damped, zeta1)
      const found = parasiticsFromShift(bare, loaded, c_add)
      if (!found.ok) return err(noShift)
      return ok({ f0_undamped: bare, f1_undamped: loaded, ...parasiticOutputs(found.value) })
    },
  ),
  'snubber.log_decrement': finiteTopic(
    z.object({ first_peak: positive, later_peak: positive, cycles: positive, f_damped: positive.optional() }),
    ({ first_peak, later_peak, cycles, f_damped }) => {
      const found = decrementOf(first_peak, later_peak, cycles)
      if (!found.ok) return err('later_peak: the amplitude must fall')
      const { logarithmicDecrement, dampingRatio, qualityFactor } = found.value
      return ok({
        log_decrement: logarithmicDecrement,
        damping_ratio: dampingRatio,
        q_factor: qualityFactor,
        ...(f_damped === undefined ? {} : { f_natural: naturalFrequency(f_damped, dampingRatio) }),
      })
    },
  ),
  'snubber.optimum': finiteTopic(
    z.object({ l_par: positive, c_par: positive, k: positive, r_series: z.number().min(0) }),
    ({ l_par, c_par, k, r_series }) => {
      const node = { inductance: l_par, capacitance: c_par, seriesResistance: r_series }
      const z0 = characteristicImpedance(node)
      const cs = k * c_par
      const least = leastOvershootResistance(node, cs)
      const most = mostDampingResistance(node, cs)
      const [best, equal] = [withSnubber(node, least, cs), withSnubber(node, z0, cs)]
      const real = allRealInterval(node, cs)
      return ok({
        z0,
        cs,
        rs_min_overshoot: least,
        overshoot_min: overshootOf(best, 0),
        zeta_at_min_overshoot: leastDamping(best),
        overshoot_at_rs_equal_z0: overshootOf(equal, 0),
        zeta_at_rs_equal_z0: leastDamping(equal),
        rs_max_damping: most,
        zeta_max: leastDamping(withSnubber(node, most, cs)),
        ...(real === null ? {} : { rs_all_real_low: real.low, rs_all_real_high: real.high }),
      })
    },
  ),
  'snubber.edge_response': edgeResponseTopic,
  'snubber.rc_dissipation_square': finiteTopic(
    z.object({
      v: positive,
      cs: positive,
      rs: positive,
      f: positive,
      duty: z.number().gt(0).lt(1).default(0.5),
    }),
    ({ v, cs, rs, f, duty }) => {
      const { power, rmsCurrent, peakCurrent } = squareWaveLoss(rs, cs, v, f, duty)
      return ok({ power, power_rule_cv2f: cs * v ** 2 * f, i_rms: rmsCurrent, i_peak: peakCurrent })
    },
  ),
  'snubber.rc_dissipation_ramp': finiteTopic(
    z.object({ v: positive, cs: positive, rs: positive, f: positive, edge_time_0_100: positive }),
    ({ v, cs, rs, f, edge_time_0_100 }) => {
      const { power, rmsCurrent, peakCurrent } = settledEdgeLoss(rs, cs, v, f, edge_time_0_100)
      return ok({
        energy_per_edge: power / (2 * f),
        power,
        power_rule_cv2f: cs * v ** 2 * f,
        i_rms: rmsCurrent,
        i_peak: peakCurrent,
      })
    },
  ),
  'snubber.current_interrupt_optimum': finiteTopic(
    z.object({ e: positive, l: positive, i0: positive, cs: positive }),
    ({ e, l, i0, cs }) => {
      const optimum = interruptOptimum({ source: e, inductance: l, current: i0, snubberCapacitance: cs })
      return ok({
        chi: optimum.currentFactor,
        zeta_opt: optimum.dampingRatio,
        rs_opt: optimum.resistance,
        v_peak_min: optimum.peakVoltage,
      })
    },
  ),
  'snubber.rcd_clamp': finiteTopic(
    z.object({
      l_leak: positive,
      i_peak: positive,
      f: positive,
      v_clamp: positive,
      n_ratio: positive,
      v_out: positive,
      ripple_v: positive,
    }),
    ({ l_leak, i_peak, f, v_clamp, n_ratio, v_out, ripple_v }) => {
      const duty = clampDuty({
        leakage: l_leak,
        peakCurrent: i_peak,
        frequency: f,
        clampVoltage: v_clamp,
        reflectedVoltage: n_ratio * v_out,
      })
      if (!duty.ok) return err('v_clamp: must be above the reflected output voltage n_ratio · v_out')
      const { power, resistance, resetTime } = duty.value
      return ok({
        power,
        r_clamp: resistance,
        c_clamp: clampCapacitance(v_clamp, ripple_v, resistance, f),
        t_reset: resetTime,
      })
    },
  ),
}

type Found = {
  readonly capacitance: number
  readonly inductance: number
  readonly characteristicImpedance: number
}

const parasiticOutputs = ({ capacitance, inductance, characteristicImpedance: z0 }: Found) => ({
  c_par: capacitance,
  l_par: inductance,
  z0,
})
