import type { EdgeSpan } from './find-edge'

/** How many standard deviations of the noise a swing must exceed to count. */
const deviations = 5

/** How many steps of the converter it must exceed. */
const steps = 1.5

/** The least part of the step that is called ringing at all. */
const leastPart = 0.01

/** So many samples before the edge are enough to know the noise. */
const looked = 2000

/** Samples so close before the crossing may belong to the foot of the edge. */
const foot = 0.1

/** The deviation from a level, in the unit of the trace, below which nothing is taken for ringing. */
export function noiseFloor(values: Float64Array, edge: EdgeSpan, step: number): number {
  const end = Math.floor(edge.crossing - foot * (edge.crossing - edge.stateStart))
  const start = Math.max(edge.stateStart, end - looked)
  let square = 0
  for (let index = start + 1; index < end; index += 1) square += difference(values, index) ** 2
  // Neighbours differ by √2 times the noise, and hardly by anything slower.
  const deviation = end - start > 2 ? Math.sqrt(square / (end - start - 1) / 2) : 0
  return Math.max(deviations * deviation, steps * converterStep(values), leastPart * Math.abs(step))
}

/** The smallest step between neighbouring samples: one step of the converter, where the values have steps. */
export function converterStep(values: Float64Array): number {
  let least = Infinity
  for (let index = 1; index < values.length; index += 1) {
    const size = Math.abs(difference(values, index))
    if (size > 0 && size < least) least = size
  }
  return Number.isFinite(least) ? least : 0
}

const difference = (values: Float64Array, index: number): number =>
  (values[index] ?? 0) - (values[index - 1] ?? 0)
