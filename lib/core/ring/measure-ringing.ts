import { findSwings, type Swing } from './find-swings'
import { fitSinusoid, type SinusoidFit } from './fit-sinusoid'
import type { Confidence, Ring, Trace } from './ring-measurement'

/** Where to look for ringing: samples `from` to `to`, about `level`, beyond `floor`. */
export type RingSearch = {
  readonly from: number
  readonly to: number
  readonly level: number
  readonly floor: number
}

export type Ringing =
  { readonly ring: Ring; readonly absence: null } | { readonly ring: null; readonly absence: string }

/** Swings that make one full cycle. */
const oneCycle = 3

/** A fit that explains less than this of the variation is of something else than one ring. */
const leastExplained = 0.5

/**
 * The ring in a part of a trace: f_d and decay rate α by a least-squares fit of one decaying sinusoid to all cycles
 * above the noise; then f_n = √(f_d² + (α/2π)²), ζ = α/(2π f_n), logarithmic decrement δ = α/f_d = 2πζ/√(1 − ζ²),
 * Q = 1/(2ζ). Linear second-order system, one dominant mode; textbook theory of the damped oscillator.
 */
export function measureRinging(trace: Trace, search: RingSearch): Ringing {
  let level = search.level
  let found: { fit: SinusoidFit; swings: readonly Swing[] } | null = null
  // The second pass looks from the level that the first one found.
  for (let pass = 0; pass < 2; pass += 1) {
    const swings = findSwings(trace.values, search.from, search.to, level, search.floor)
    if (swings.length < oneCycle) return { ring: null, absence: tooFew(swings.length) }
    const fit = fitSwings(trace.values, swings, search.to, level)
    if (fit === null || fit.explained < leastExplained) return { ring: null, absence: notOneRing }
    if (fit.model.decay <= 0) return { ring: null, absence: growing }
    found = { fit, swings }
    level = fit.model.level
  }
  return found === null
    ? { ring: null, absence: notOneRing }
    : { ring: ringOf(trace, found.fit, found.swings, search.to), absence: null }
}

function fitSwings(
  values: Float64Array,
  swings: readonly Swing[],
  to: number,
  level: number,
): SinusoidFit | null {
  const [first] = swings
  const last = swings.at(-1)
  if (first === undefined || last === undefined) return null
  const halfCycle = (last.index - first.index) / (swings.length - 1)
  const decay = Math.log(Math.abs(first.deviation / last.deviation)) / (last.index - first.index)
  const guess = { level, cosine: first.deviation, sine: 0, decay, omega: Math.PI / halfCycle }
  return fitSinusoid(values, first.index, endOf(swings, to), guess)
}

/** Half a half cycle after the last swing, where the fit ends. */
function endOf(swings: readonly Swing[], to: number): number {
  const first = swings[0]?.index ?? 0
  const last = swings.at(-1)?.index ?? 0
  return Math.min(to, Math.round(last + (last - first) / (swings.length - 1) / 2) + 1)
}

function ringOf(trace: Trace, fit: SinusoidFit, swings: readonly Swing[], to: number): Ring {
  const { model } = fit
  const omega = model.omega / trace.intervalSeconds
  const decayRate = model.decay / trace.intervalSeconds
  const natural = Math.hypot(omega, decayRate)
  const first = swings[0]?.index ?? 0
  const cyclesUsed = (swings.length - 1) / 2
  return {
    dampedFrequency: omega / (2 * Math.PI),
    naturalFrequency: natural / (2 * Math.PI),
    dampingRatio: decayRate / natural,
    logDecrement: (2 * Math.PI * decayRate) / omega,
    qualityFactor: natural / (2 * decayRate),
    cyclesUsed,
    confidence: confidenceOf(cyclesUsed, fit.explained, (2 * Math.PI) / model.omega),
    fit: {
      startSeconds: trace.startSeconds + first * trace.intervalSeconds,
      endSeconds: trace.startSeconds + (endOf(swings, to) - 1) * trace.intervalSeconds,
      level: model.level,
      amplitude: Math.hypot(model.cosine, model.sine),
      phase: Math.atan2(-model.sine, model.cosine),
      decayRate,
      residualRms: fit.residualRms,
    },
  }
}

/** From how much the result rests on; the bounds are common practice, no source. */
function confidenceOf(cycles: number, explained: number, samplesPerCycle: number): Confidence {
  if (cycles >= 4 && explained >= 0.98 && samplesPerCycle >= 8) return 'high'
  return cycles >= 2 && explained >= 0.9 && samplesPerCycle >= 4 ? 'medium' : 'low'
}

const tooFew = (swings: number): string =>
  swings < 2
    ? 'No oscillation stands above the noise after the edge.'
    : 'Less than one full cycle stands above the noise after the edge, too little to tell a frequency.'

const notOneRing = 'What follows the edge is not one decaying oscillation.'

const growing = 'The oscillation after the edge does not decay within the window, so it has no damping ratio.'
