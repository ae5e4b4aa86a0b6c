import type { Ring, Trace } from '../ring/ring-measurement'
import { fitLinear, refineRates, type Rates, type Stretched, type TailFit } from './tail-fit'

/** A ring of more cycles than this outlasts the tail that it rides on. */
const mostCycles = 4

/** A tail is looked for where a fit without one leaves over more than so many times the noise. */
const likeNoise = 1.15

/** A fit with a tail is better when it leaves over less than this part. */
const better = 0.8

const mostPoints = 3000

/** Tails that are tried first, as multiples of the decay of the ring. */
const firstTails = [0.4, 1, 2.5] as const

/** A ring and the exponential that it rides on, from the start of its fit. */
export type RingWithTail = {
  readonly ring: Ring
  /** Amplitude at the start of the fit, and decay per second. */
  readonly tail: { readonly amplitude: number; readonly rate: number }
}

/**
 * The ring of a damped node, which rides on a slow exponential: an R-C across an L-C node has three poles. Least squares of
 * level + e^(−αt)(a cos ωt + b sin ωt) + c e^(−γt), the linear parameters eliminated in every step (variable projection: G. H.
 * Golub, V. Pereyra, SIAM J. Numer. Anal. 10, 1973, from memory), the rates by Levenberg and Marquardt. Null where the ring
 * lasts for more than four cycles, where the fit without a tail leaves over noise only, or where a tail does not help.
 */
export function ringOverTail(trace: Trace, ring: Ring, to: number, noise: number): RingWithTail | null {
  const { intervalSeconds, startSeconds, values } = trace
  if (ring.cyclesUsed > mostCycles || ring.fit.residualRms < likeNoise * noise) return null
  const from = Math.round((ring.fit.startSeconds - startSeconds) / intervalSeconds)
  const decay = ring.fit.decayRate * intervalSeconds
  const end = Math.min(to, from + Math.ceil(12 / decay))
  const stride = Math.max(1, Math.floor((end - from) / mostPoints))
  const stretch: Stretched = {
    samples: Float64Array.from(
      { length: Math.floor((end - from) / stride) },
      (_, index) => values[from + index * stride] ?? 0,
    ),
    stride,
  }
  const omega = 2 * Math.PI * ring.dampedFrequency * intervalSeconds
  const without = fitLinear(stretch, [decay, omega, Infinity])
  const best = leastOf(firstTails.map((factor) => refineRates(stretch, [decay, omega, factor * decay])))
  if (best === null || without === null || best.square > better ** 2 * without.square) return null
  return isSane(best.rates, decay, omega) ? rebuilt(ring, best, stretch, intervalSeconds) : null
}

function leastOf(fits: readonly (TailFit | null)[]): TailFit | null {
  let least: TailFit | null = null
  for (const fit of fits) if (fit !== null && fit.square < (least?.square ?? Infinity)) least = fit
  return least
}

const isSane = ([decay, omega, tail]: Rates, firstDecay: number, firstOmega: number): boolean =>
  decay > 0 &&
  tail > 0 &&
  Math.abs(Math.log(omega / firstOmega)) < 0.4 &&
  Math.abs(Math.log(decay / firstDecay)) < 1

function rebuilt(
  ring: Ring,
  { rates, square, linear }: TailFit,
  { samples, stride }: Stretched,
  intervalSeconds: number,
): RingWithTail {
  const [decay, omega, tail] = rates
  const [level = 0, cosine = 0, sine = 0, amplitude = 0] = linear
  const natural = Math.hypot(decay, omega)
  const ringAlone: Ring = {
    ...ring,
    dampedFrequency: omega / (2 * Math.PI * intervalSeconds),
    naturalFrequency: natural / (2 * Math.PI * intervalSeconds),
    dampingRatio: decay / natural,
    logDecrement: (2 * Math.PI * decay) / omega,
    qualityFactor: natural / (2 * decay),
    fit: {
      ...ring.fit,
      endSeconds: ring.fit.startSeconds + (samples.length - 1) * stride * intervalSeconds,
      level,
      amplitude: Math.hypot(cosine, sine),
      phase: Math.atan2(-sine, cosine),
      decayRate: decay / intervalSeconds,
      residualRms: Math.sqrt(square / samples.length),
    },
  }
  return { ring: ringAlone, tail: { amplitude, rate: tail / intervalSeconds } }
}
