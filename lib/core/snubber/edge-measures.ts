import type { Complex } from '../linear/complex'
import { highestIn, largestMagnitudeIn, type Window } from './crest'
import { valueOf, type EdgeResponse } from './edge-response'

/** After so many time constants a mode is gone. */
const settled = 40

/** A ring that lasts longer is nearly undamped: its first cycles are as large as any. */
const mostCycles = 64

/** Points of each window in which a crossing is looked for. */
const samples = 30

/** The largest value of a response that ends at its final value. */
export const peakOf = (response: EdgeResponse, poles: readonly Complex[]): number =>
  Math.max(...aroundEnd(response, cyclesOf(poles)).map(highestIn))

/** The largest magnitude, for a current that swings both ways and may be largest at the beginning of the edge. */
export const peakMagnitudeOf = (response: EdgeResponse, poles: readonly Complex[]): number =>
  Math.max(...everywhere(response, poles).map(largestMagnitudeIn))

/**
 * Where a rising response peaks: within the first cycle of each mode after the edge, since every mode decays from there,
 * or within the last cycle before its end, where the slope adds to the ring.
 */
function aroundEnd({ edge, onEdge, after }: EdgeResponse, cycles: readonly number[]): readonly Window[] {
  const afterEnd = cycles.map((to): Window => ({ stretch: after, from: 0, to }))
  if (edge === 0) return afterEnd
  const begins = new Set(cycles.map((cycle) => Math.max(0, edge - cycle)))
  return [...[...begins].map((from): Window => ({ stretch: onEdge, from, to: edge })), ...afterEnd]
}

/** Besides, cycle by cycle from the beginning of the edge: a ring decays while what it rides on still rises. */
function everywhere(response: EdgeResponse, poles: readonly Complex[]): readonly Window[] {
  const { edge, onEdge: stretch } = response
  const cycles = cyclesOf(poles)
  const around = aroundEnd(response, cycles)
  if (edge <= Math.min(...cycles)) return around
  const decays = poles.map(({ re }) => (2.2 * Math.PI) / Math.abs(re))
  const length = Math.min(edge, Math.max(...decays))
  const beginnings = cycles.flatMap((cycle) => {
    const count = Math.min(mostCycles, Math.ceil(length / cycle))
    return Array.from({ length: count }, (_, index): Window => {
      const from = index * cycle
      return { stretch, from, to: Math.min(from + cycle, edge) }
    })
  })
  return [...beginnings, ...around]
}

const cyclesOf = (poles: readonly Complex[]): readonly number[] => [...new Set(poles.flatMap(spansOf))]

/**
 * A little more than the cycle of an oscillation; seven time constants of what does not oscillate; both where a pair of
 * poles is so nearly real that its cycle is much longer than what it does at the beginning.
 */
function spansOf({ re, im }: Complex): readonly number[] {
  const decay = (2.2 * Math.PI) / Math.abs(re)
  if (im === 0) return [decay]
  const cycle = Math.min((2.2 * Math.PI) / Math.abs(im), (20 * Math.PI) / Math.hypot(re, im))
  return decay < cycle ? [decay, cycle] : [cycle]
}

/** The time from the first crossing of 10 % to the first crossing of 90 % of the final value, normalised. */
export function riseTimeOf(response: EdgeResponse, poles: readonly Complex[]): number {
  const times = rasterOf(response, poles)
  return firstCrossing(response, times, 0.9) - firstCrossing(response, times, 0.1)
}

function rasterOf(response: EdgeResponse, poles: readonly Complex[]): readonly number[] {
  const { edge, after } = response
  const slowest = Math.min(...poles.map((pole) => -pole.re))
  const spans = [
    ...everywhere(response, poles).map(({ stretch, from, to }) => {
      const begin = stretch === after ? edge : 0
      return [begin + from, begin + to] as const
    }),
    [0, edge] as const,
    [edge, edge + (slowest > 0 ? settled / slowest : 0)] as const,
  ]
  const times = spans.flatMap(([from, to]) =>
    Array.from({ length: samples + 1 }, (_, index) => from + (index * (to - from)) / samples),
  )
  return times.sort((a, b) => a - b)
}

function firstCrossing(response: EdgeResponse, times: readonly number[], level: number): number {
  const index = times.findIndex((time) => valueOf(response, time) >= level)
  let low = times[index - 1] ?? 0
  let high = times[index] ?? times.at(-1) ?? 0
  for (let halving = 0; halving < 60; halving += 1) {
    const middle = (low + high) / 2
    if (valueOf(response, middle) < level) low = middle
    else high = middle
  }
  return (low + high) / 2
}
