import type { Trace } from '@/lib/core/ring/ring-measurement'

/** An edge that was composed from numbers, so that every result is known. */
export type ComposedEdge = {
  readonly base: number
  readonly top: number
  readonly frequency: number
  readonly dampingRatio: number
  /** The first peak beyond the top, as a part of the step. */
  readonly overshoot: number
  /** Root mean square of the noise; the pattern is the same every time. */
  readonly noise: number
  /** One step of the converter; 0 for none. */
  readonly step: number
  readonly seconds: number
}

export const composedEdge: ComposedEdge = {
  base: 0,
  top: 10,
  frequency: 50e6,
  dampingRatio: 0.03,
  overshoot: 0.6,
  noise: 0.02,
  step: 0.1,
  seconds: 1e-6,
}

const interval = 0.25e-9
const before = 400e-9
const ramp = 2e-9

/** A settled base, a ramp that lands on the first crest, and a decaying cosine from there. */
export function ringingEdge(edge: ComposedEdge): Trace {
  const random = noiseFrom(1)
  const count = Math.round((before + edge.seconds) / interval)
  const values = Float64Array.from({ length: count }, (_, index) => {
    const value = valueAt(edge, index * interval - before) + edge.noise * random()
    return edge.step === 0 ? value : Math.round(value / edge.step) * edge.step
  })
  return { values, startSeconds: -before, intervalSeconds: interval }
}

function valueAt({ base, top, overshoot, frequency, dampingRatio }: ComposedEdge, time: number): number {
  if (time <= 0) return base
  const crest = top + overshoot * (top - base)
  if (time <= ramp) return base + ((crest - base) * time) / ramp
  const omega = 2 * Math.PI * frequency
  const decay = (omega * dampingRatio) / Math.sqrt(1 - dampingRatio ** 2)
  return top + (crest - top) * Math.exp(-decay * (time - ramp)) * Math.cos(omega * (time - ramp))
}

/** Normal deviates by the polar pairs of Box and Muller over a linear congruential generator. */
export function noiseFrom(seed: number): () => number {
  let state = seed
  const uniform = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0
    return (state + 0.5) / 2 ** 32
  }
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform())
}
