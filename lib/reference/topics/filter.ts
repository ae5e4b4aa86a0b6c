import { z } from 'zod'

import { impedanceCriterion } from '@/lib/core/filter/impedance-criterion'
import { cornerFor, optimalDamping } from '@/lib/core/filter/low-pass'
import { err, ok } from '@/lib/core/result'

import type { Topics } from '../topic'
import { finiteTopic } from './finite-topic'

const positive = z.number().positive()

export const filterTopics: Topics = {
  'filter.required_attenuation': finiteTopic(
    z.object({ measured_dbuv: z.number(), limit_dbuv: z.number(), margin_db: z.number(), f: positive }),
    ({ measured_dbuv, limit_dbuv, margin_db, f }) => {
      const attenuation = measured_dbuv - limit_dbuv + margin_db
      if (!(attenuation > 0))
        return err('measured_dbuv: below the limit by the margin, so no filter is needed')
      const { asymptotic, exact } = cornerFor(attenuation, f)
      return ok({
        attenuation_db: attenuation,
        fc_asymptotic_40db_per_decade: asymptotic,
        fc_exact_undamped: exact,
        lc_product: 1 / (2 * Math.PI * exact) ** 2,
      })
    },
  ),
  'filter.parallel_rc_damping': finiteTopic(
    z.object({ l: positive, c: positive, n: positive }),
    ({ l, c, n }) => {
      const damped = optimalDamping(l, c, n)
      const r0 = damped.characteristicImpedance
      return ok({
        r0,
        q_opt: damped.resistance / r0,
        rd_opt: damped.resistance,
        cd: damped.capacitance,
        z_peak: damped.peakImpedance,
        z_peak_over_r0: damped.peakImpedance / r0,
        f_peak: damped.peakFrequency,
      })
    },
  ),
  'filter.impedance_criterion': finiteTopic(
    z.object({ v_in: positive, p_in: positive, z_out_peak: positive }),
    ({ v_in, p_in, z_out_peak }) => {
      const { incrementalResistance, margin } = impedanceCriterion(v_in, p_in, z_out_peak)
      return ok({ z_in_incremental: incrementalResistance, ratio_db: margin })
    },
  ),
}
