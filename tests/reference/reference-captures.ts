import { readFileSync } from 'node:fs'

import { z } from 'zod'

import type { Capture } from '@/lib/core/waveform/capture'
import { parseCapture } from '@/lib/core/waveform/parse-capture'

import { captureBytes } from './capture-bytes'

export { captureBytes } from './capture-bytes'

const truthSchema = z.object({
  ring_frequency: z.number().nullable().default(null),
  natural_frequency: z.number().nullable().default(null),
  damping_ratio: z.number().nullable().default(null),
  rise_time_10_90: z.number(),
  overshoot_fraction: z.number(),
  base_level: z.number().optional(),
  top_level: z.number().optional(),
  edge: z.enum(['rising', 'falling']).default('rising'),
})

const descriptionSchema = z.object({
  origin: z.string(),
  sample_rate: z.number(),
  samples: z.number(),
  tolerance: z.object({
    ring_frequency_rel: z.number().default(0),
    damping_ratio_rel: z.number().default(0),
    rise_time_rel: z.number(),
    overshoot_abs: z.number(),
  }),
  truth: z.record(z.string(), z.unknown()),
})

/** What a capture is known to hold, from the circuit or formula that made it. */
export type Truth = z.infer<typeof truthSchema>
export type CaptureDescription = z.infer<typeof descriptionSchema>

const folder = new URL('./captures/', import.meta.url)

export function describedCapture(file: string): CaptureDescription {
  const text = readFileSync(new URL(file.replace(/\.\w+$/u, '.json'), folder), 'utf8')
  return descriptionSchema.parse(JSON.parse(text))
}

/** The truth of a capture, or of one of its channels. */
export const truthOf = (description: CaptureDescription, channel?: string): Truth =>
  truthSchema.parse(channel === undefined ? description.truth : description.truth[channel])

export function readCapture(file: string): Capture {
  const parsed = parseCapture(captureBytes(file))
  if (!parsed.ok) throw new Error(parsed.error.message)
  return parsed.value
}
