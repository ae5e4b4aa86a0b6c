import { z } from 'zod'

import { shortCableField, smallLoopField } from '@/lib/core/emission/radiated-field'
import { polygonField } from '@/lib/core/near-field/biot-savart'
import { loopAxisField } from '@/lib/core/near-field/loop-axis'
import { magneticDipole } from '@/lib/core/near-field/magnetic-dipole'
import { vacuumPermeability } from '@/lib/core/physics/constants'
import { ok } from '@/lib/core/result'
import { levelOfRms, rmsOfLevel } from '@/lib/core/spectrum/level'

import type { Topics } from '../topic'
import { finiteTopic } from './finite-topic'

const positive = z.number().positive()
const vector = z.tuple([z.number(), z.number(), z.number()])
const overGround = z.boolean().default(false)

/** Full reflection at a ground plane doubles the field at most. */
const reflected = (isOverGround: boolean): number => (isOverGround ? 2 : 1)

export const emissionTopics: Topics = {
  'radiation.dm_loop': finiteTopic(
    z.object({ area: positive, i: positive, f: positive, r: positive, ground_reflection: overGround }),
    ({ area, i, f, r, ground_reflection }) => {
      const field = reflected(ground_reflection) * smallLoopField(f, area, i, r)
      const handbook = (reflected(ground_reflection) * 131.6e-16 * f ** 2 * area * i) / r
      return ok({ e_field: field, e_dbuv_per_m: levelOfRms(field), ott_131p6e_minus16: handbook })
    },
  ),
  'radiation.cm_cable': finiteTopic(
    z.object({
      length: positive,
      i_common_mode_total: positive,
      f: positive,
      r: positive,
      ground_reflection: overGround,
    }),
    ({ length, i_common_mode_total: current, f, r, ground_reflection }) => {
      const perAmpere = reflected(ground_reflection) * shortCableField(f, length, 1, r)
      const field = perAmpere * current
      return ok({
        e_field: field,
        e_dbuv_per_m: levelOfRms(field),
        current_limit_for_30dbuvm: rmsOfLevel(30) / perAmpere,
      })
    },
  ),
  'nearfield.magnetic_dipole': finiteTopic(
    z.object({
      area: positive,
      i: positive,
      f: positive,
      r: positive,
      theta_deg: z.number().min(0).max(180),
    }),
    ({ area, i, f, r, theta_deg }) => {
      const { radial, transverse, electric, kr } = magneticDipole(i * area, f, r, (theta_deg * Math.PI) / 180)
      return ok({
        h_r: radial,
        h_theta: transverse,
        e_phi: electric,
        kr,
        // On the axis there is neither field across the line of sight, so their ratio is left out.
        ...(transverse === 0 ? {} : { wave_impedance: electric / transverse }),
      })
    },
  ),
  'nearfield.loop_axis': finiteTopic(
    z.object({ radius: positive, i: z.number(), z: z.number() }),
    ({ radius, i, z: height }) => {
      const field = loopAxisField(i, radius, height)
      return ok({ h: field, b: vacuumPermeability * field })
    },
  ),
  'nearfield.polygon_biot_savart': finiteTopic(
    z.object({ points: z.array(vector).max(10_000), i: z.number(), at: vector }),
    ({ points, i, at }) => {
      const field = polygonField(points, i, at)
      if (!field.ok) return field
      const [hx, hy, hz] = field.value
      return ok({ hx, hy, hz, h_abs: Math.hypot(hx, hy, hz) })
    },
  ),
}
