import { z } from 'zod'

import { wavelengthOf } from '@/lib/core/emission/radiated-field'
import { ok } from '@/lib/core/result'
import { planeWaveShielding, skinDepth } from '@/lib/core/shielding/plane-shield'

import type { Topics } from '../topic'
import { finiteTopic } from './finite-topic'

const positive = z.number().positive()

export const shieldingTopics: Topics = {
  'shielding.skin_depth': finiteTopic(
    z.object({ conductivity: positive, mu_r: positive.default(1), f: positive, thickness: positive }),
    ({ conductivity, mu_r, f, thickness }) => {
      const sheet = { conductivity, permeability: mu_r, thickness }
      const { absorption, reflection, multipleReflection } = planeWaveShielding(f, sheet)
      return ok({
        skin_depth: skinDepth(f, sheet),
        absorption_db: absorption,
        reflection_db: reflection,
        re_reflection_db: multipleReflection,
        se_plane_wave_db: absorption + reflection + multipleReflection,
      })
    },
  ),
  'shielding.stitching_spacing': finiteTopic(
    z.object({ f_max: positive, eps_eff: z.number().min(1), fraction: positive }),
    ({ f_max, eps_eff, fraction }) => {
      const wavelength = wavelengthOf(f_max) / Math.sqrt(eps_eff)
      return ok({ wavelength, spacing: wavelength / fraction })
    },
  ),
}
