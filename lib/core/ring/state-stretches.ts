import type { StateLevels } from './ring-measurement'

/** Samples within this part of the step around a level are at rest there. */
const atRest = 0.1

/** A stretch of which this part is at rest is a state; of a ring wide enough to cross the middle, only 13 % is. */
const restPart = 0.3

/** Fewer samples at rest than this are chance. */
const restSamples = 8

/** Crossings count when the trace goes through the band from 40 to 60 %, so that noise makes none. */
const hysteresis = 0.1

/** Samples that lie on one side of the middle between two levels: [start, end). */
export type Stretch = { readonly start: number; readonly end: number; readonly high: boolean }

/** The record cut where it goes through the middle between the levels. */
export function stretchesOf(values: Float64Array, { base, top }: StateLevels): readonly Stretch[] {
  const middle = (base + top) / 2
  const band = hysteresis * (top - base)
  const stretches: Stretch[] = []
  let high = (values[0] ?? 0) > middle
  let start = 0
  let lastOnSide = 0
  for (let index = 1; index < values.length; index += 1) {
    const value = values[index] ?? 0
    if (value > middle === high) lastOnSide = index
    if (high ? value > middle - band : value < middle + band) continue
    stretches.push({ start, end: lastOnSide + 1, high })
    start = lastOnSide + 1
    lastOnSide = index
    high = !high
  }
  stretches.push({ start, end: values.length, high })
  return stretches
}

/** Whether a stretch is at rest at its level for long enough to be a state. */
export function restsAtLevel(
  values: Float64Array,
  { base, top }: StateLevels,
  { start, end, high }: Stretch,
): boolean {
  const level = high ? top : base
  const reach = atRest * (top - base)
  let count = 0
  for (let index = start; index < end; index += 1) {
    if (Math.abs((values[index] ?? 0) - level) <= reach) count += 1
  }
  return count >= Math.max(restSamples, restPart * (end - start))
}
