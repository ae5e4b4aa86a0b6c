import { z } from 'zod'

import { receiverBands, type ReceiverBandId } from '@/lib/core/receiver/bands'
import { coupledStagesBandwidths, gaussianBandwidths } from '@/lib/core/receiver/filter-bandwidths'
import { pulseResponse } from '@/lib/core/receiver/pulse-response'
import { err, ok } from '@/lib/core/result'

import type { Topics } from '../topic'
import { topicOf } from '../topic-of'

const bandIds: Readonly<Record<string, ReceiverBandId>> = {
  A: 'A',
  B: 'B',
  C: 'C',
  D: 'D',
  CD: 'C',
  'C/D': 'C',
  E: 'E',
}

const bandwidthsSchema = z.object({
  b6: z.number().positive(),
  filter_models: z.array(z.string()).optional(),
})

const pulseSchema = z.object({
  band: z.string(),
  b6: z.number().positive(),
  /** Null or “isolated” for a single pulse. */
  prf: z.union([z.number().positive(), z.null(), z.literal('isolated')]),
  impulse_area_emf_vs: z.number().positive(),
  tuning: z.string().optional(),
})

export const receiverTopics: Topics = {
  'receiver.bandwidths': topicOf(bandwidthsSchema, ({ b6 }) => {
    const gaussian = gaussianBandwidths(b6)
    const coupled = coupledStagesBandwidths(b6)
    return ok({
      gauss_b3: gaussian.width3dB,
      gauss_impulse_bw: gaussian.impulse,
      gauss_noise_bw: gaussian.noise,
      crit_b3: coupled.width3dB,
      crit_impulse_bw: coupled.impulse,
      crit_noise_bw: coupled.noise,
    })
  }),
  'receiver.pulse_response': topicOf(pulseSchema, ({ band, b6, prf, impulse_area_emf_vs }) => {
    const id = Object.hasOwn(bandIds, band) ? bandIds[band] : undefined
    if (id === undefined) return err(`band: there is no band “${band}”`)
    const rate = typeof prf === 'number' ? prf : null
    const readings = pulseResponse(receiverBands[id], { area: impulse_area_emf_vs, rate }, b6)
    if (!readings.ok) return err(readings.error.message)
    const { peak, quasiPeak, average, relative } = readings.value
    return ok({
      peak_dbuv: peak,
      quasi_peak_dbuv: quasiPeak,
      ...(average === null ? {} : { average_dbuv: average }),
      qp_relative_to_reference_prf_db: relative,
    })
  }),
}
