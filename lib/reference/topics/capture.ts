import { z } from 'zod'

import { analyseCapture } from '@/lib/core/capture/analyse-capture'
import type { CaptureAnalysis, Tones, TwoStates } from '@/lib/core/capture/capture-analysis'
import { tonesOf } from '@/lib/core/capture/tones-of'
import { err, ok, type Result } from '@/lib/core/result'
import type { Capture } from '@/lib/core/waveform/capture'
import { parseCapture } from '@/lib/core/waveform/parse-capture'

import type { Outputs, Topics } from '../topic'
import { topicOf } from '../topic-of'

const fileSchema = z.object({ file: z.string().min(1) })

export const captureTopics: Topics = {
  'capture.analysis': topicOf(fileSchema, ({ file }, readCapture) => {
    const parsed = parseCapture(readCapture(file))
    return parsed.ok ? outputsOf(parsed.value) : err(`${file}: ${parsed.error.message}`)
  }),
}

/** The outputs of the only channel, or of each channel by its name. */
function outputsOf({ channels, startSeconds, intervalSeconds }: Capture): Result<Outputs, string> {
  const outputs: Record<string, Outputs> = {}
  for (const { name, values } of channels) {
    const analysed = analyseCapture(values, startSeconds, intervalSeconds)
    if (!analysed.ok) return err(`${name}: ${analysed.error.message}`)
    const { states, tones } = analysed.value
    // The lines of a train are given too: a wave of few sines may look like edges.
    const lines = states?.kind === 'train' ? tonesOf(values, intervalSeconds) : tones
    outputs[name] = channelOutputs(analysed.value, lines)
  }
  const [only] = channels
  return ok(channels.length === 1 && only !== undefined ? (outputs[only.name] ?? {}) : outputs)
}

const channelOutputs = (
  { states, minimum, maximum, warnings }: CaptureAnalysis,
  tones: Tones | null,
): Outputs => ({
  ...(states === null ? noStates : stateOutputs(states)),
  tones:
    tones?.list.map(({ frequency, amplitude, level }) => ({
      f: frequency,
      peak: amplitude,
      dbuv_rms: level,
    })) ?? null,
  minimum,
  maximum,
  warnings,
})

function stateOutputs(states: TwoStates): Outputs {
  const { ring, overshoot, period, harmonics, riseTime, fallTime } = states
  const isTrain = states.kind === 'train'
  return {
    ring_frequency: ring?.dampedFrequency.value ?? null,
    natural_frequency: ring?.naturalFrequency ?? null,
    damping_ratio: ring?.dampingRatio.value ?? null,
    ring_absence: states.ringAbsence,
    // Of a falling step, 10 to 90 % of its way from base to top.
    rise_time_10_90: riseTime?.median ?? fallTime?.median ?? null,
    fall_time_90_10: fallTime?.median ?? null,
    overshoot_fraction: overshoot.reconstructed ?? overshoot.fraction,
    overshoot_is_lower_bound: overshoot.isLowerBound,
    overshoot_measured: overshoot.fraction,
    base_level: states.base,
    top_level: states.top,
    peak_level: overshoot.peakLevel,
    edge: isTrain ? null : states.direction,
    fundamental: period?.fundamental ?? null,
    period: period?.seconds ?? null,
    duty_50: period?.duty ?? null,
    amplitude: states.amplitude,
    harmonics:
      harmonics?.list.map(({ order, frequency, amplitude, level }) => ({
        n: order,
        f: frequency,
        peak: amplitude,
        dbuv_rms: level,
      })) ?? null,
  }
}

const noStates: Outputs = {
  ring_frequency: null,
  natural_frequency: null,
  damping_ratio: null,
  ring_absence: 'The record does not rest at two levels, so it has no edges that could ring.',
  rise_time_10_90: null,
  fall_time_90_10: null,
  overshoot_fraction: null,
  overshoot_is_lower_bound: false,
  overshoot_measured: null,
  base_level: null,
  top_level: null,
  peak_level: null,
  edge: null,
  fundamental: null,
  period: null,
  duty_50: null,
  amplitude: null,
  harmonics: null,
}
