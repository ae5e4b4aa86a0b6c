import { minimiseOn } from '../linear/minimise'
import { magnitude, type Complex } from '../linear/complex'
import { valueOf, type EdgeResponse } from './edge-response'

/** Enough in each window to find the highest swing; the golden section then finds its crest. */
const samples = 30

/** After so many time constants a mode is gone. */
const settled = 40

type Window = readonly [from: number, to: number]

type Extreme = { readonly time: number; readonly value: number }

/** The largest value of a response that ends at its final value, and when it is reached, in normalised time. */
export const peakOf = (response: EdgeResponse, poles: readonly Complex[]): Extreme =>
  maximumIn(aroundEnd(response, poles), (time) => valueOf(response, time))

/** The largest magnitude, for a current that swings both ways and may be largest at the beginning of the edge. */
export const peakMagnitudeOf = (response: EdgeResponse, poles: readonly Complex[]): number =>
  maximumIn(everywhere(response, poles), (time) => Math.abs(valueOf(response, time))).value

/**
 * Where a rising response peaks: within the first cycle of each mode after the edge, since every mode decays from there,
 * or within the last cycle before its end, where the slope adds to the ring.
 */
function aroundEnd({ edge }: EdgeResponse, poles: readonly Complex[]): readonly Window[] {
  const cycles = new Set(poles.map(cycleOf))
  return [...cycles].flatMap((cycle): Window[] =>
    edge === 0
      ? [[0, cycle]]
      : [
          [Math.max(0, edge - cycle), edge],
          [edge, edge + cycle],
        ],
  )
}

function everywhere(response: EdgeResponse, poles: readonly Complex[]): readonly Window[] {
  const { edge } = response
  const beginnings = edge === 0 ? [] : [...new Set(poles.map(cycleOf))].map((cycle) => Math.min(cycle, edge))
  return [...beginnings.map((end): Window => [0, end]), ...aroundEnd(response, poles)]
}

/** A little more than the cycle of an oscillation; seven time constants of what does not oscillate. */
function cycleOf(pole: Complex): number {
  const size = magnitude(pole)
  const slowest = (20 * Math.PI) / size
  return pole.im === 0 ? (2.2 * Math.PI) / size : Math.min((2.2 * Math.PI) / Math.abs(pole.im), slowest)
}

function maximumIn(windows: readonly Window[], at: (time: number) => number): Extreme {
  let best = { time: 0, value: at(0), step: 0 }
  for (const [from, to] of windows) {
    const step = (to - from) / samples
    for (let index = 0; index <= samples; index += 1) {
      const time = from + index * step
      const value = at(time)
      if (value > best.value) best = { time, value, step }
    }
  }
  const crest = minimiseOn(
    (time) => -at(time),
    Math.max(0, best.time - best.step),
    best.time + best.step,
    1e-7,
  )
  return at(crest) > best.value ? { time: crest, value: at(crest) } : best
}

/** The time from the first crossing of 10 % to the first crossing of 90 % of the final value, normalised. */
export function riseTimeOf(response: EdgeResponse, poles: readonly Complex[]): number {
  const times = rasterOf(response, poles)
  return firstCrossing(response, times, 0.9) - firstCrossing(response, times, 0.1)
}

function rasterOf(response: EdgeResponse, poles: readonly Complex[]): readonly number[] {
  const slowest = Math.min(...poles.map((pole) => -pole.re))
  const windows: readonly Window[] = [
    ...everywhere(response, poles),
    [0, response.edge],
    [response.edge, response.edge + (slowest > 0 ? settled / slowest : 0)],
  ]
  const times = windows.flatMap(([from, to]) =>
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
