import { err, ok, type Result } from '../result'
import type { CaptureAnalysis, CaptureAnalysisError, TwoStates } from './capture-analysis'
import { sampleNoise } from './sample-noise'
import { tonesOf } from './tones-of'
import { twoLevels } from './two-levels'
import { twoStates } from './two-states'
import { summariseValues } from './value-range'

const fewestSamples = 32

/**
 * What one channel of a capture shows. Values in any one unit (volts for levels in dBµV) at a constant interval in seconds.
 *
 * A record that rests at two levels: the levels (modes of the histogram), every edge between them, transition times from 10
 * to 90 % and back, overshoot (peak − top)/(top − base), the ring after the edges, and of a train the period, duty at 50 %
 * and harmonics. A record that does not: its sines. Range: 32 samples or more; a ring shows from four samples a cycle on.
 *
 * Source of levels and transitions: IEEE Std 181-2011. Errors: fewer samples, an interval that is not above 0, a value that
 * is not finite.
 */
export function analyseCapture(
  values: Float64Array,
  startSeconds: number,
  intervalSeconds: number,
): Result<CaptureAnalysis, CaptureAnalysisError> {
  if (values.length < fewestSamples) return err(tooFewSamples)
  if (!(intervalSeconds > 0) || !Number.isFinite(intervalSeconds)) return err(intervalNotPositive)
  const summary = summariseValues(values)
  if (summary === null) return err(notFinite)
  const noise = sampleNoise(values, summary.converterStep)
  const levels = twoLevels(values, summary, noise)
  const trace = { values, startSeconds, intervalSeconds }
  const states = levels === null ? null : twoStates(trace, levels, noise, summary)
  return ok({
    ...summary,
    states,
    tones: states === null ? tonesOf(values, intervalSeconds) : null,
    warnings: states === null ? [] : warningsOf(states, intervalSeconds),
  })
}

/** Fewer samples in a transition than this make it a guess at the bandwidth of the instrument. */
const fewInTransition = 3

function warningsOf(states: TwoStates, intervalSeconds: number): readonly string[] {
  const quickest = Math.min(states.riseTime?.median ?? Infinity, states.fallTime?.median ?? Infinity)
  return [
    ...(states.overshoot.isLowerBound ? [clippedWarning] : []),
    ...(quickest < fewInTransition * intervalSeconds ? [coarseWarning] : []),
  ]
}

const clippedWarning =
  'The peaks are cut off by the vertical range of the instrument: the overshoot is at least the stated value, and the ring is measured after the cut-off part.'

const coarseWarning =
  'An edge takes fewer than three samples from 10 to 90 %; its time is interpolated, and may be that of the instrument.'

const tooFewSamples: CaptureAnalysisError = {
  code: 'too_few_samples',
  message: `The record holds fewer than ${fewestSamples} samples; export a longer one.`,
}

const intervalNotPositive: CaptureAnalysisError = {
  code: 'interval_not_positive',
  message: 'The sample interval must be more than 0 s; give the interval or a time column that rises.',
}

const notFinite: CaptureAnalysisError = {
  code: 'value_not_finite',
  message: 'The record holds a value that is not a finite number; take it out or export the capture again.',
}
