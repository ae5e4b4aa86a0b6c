import type { Figure, Mark, Series } from '../figure/figure'
import { formatQuantity, quantityText } from '../units/format-quantity'
import { decimateMinMax } from '../waveform/decimate-min-max'

import type { Ring, RingFit, RingMeasurement, Trace } from './ring-measurement'

/** The points of both lines together stay below 1200. */
const measuredColumns = 350
const fittedPoints = 480

/** So many cycles can be told apart on paper. */
const cyclesShown = 12

/** Without a ring, so many transition times after the edge are shown. */
const transitionsShown = 12

/** The measured edge with its levels and, where there is one, the fitted ring over it. */
export function ringFigure(measurement: RingMeasurement, trace: Trace, unit: 'V' | 'A' | ''): Figure {
  const [from, to] = shownRange(measurement)
  const { ring, levels } = measurement
  return {
    id: 'ring',
    title: ring === null ? 'Edge' : 'Edge and ringing',
    description: describe(measurement),
    x: { label: 'Time', unit: 's', scale: 'linear', range: [from, to] },
    y: { label: unit === 'A' ? 'Current' : unit === 'V' ? 'Voltage' : 'Value', unit, scale: 'linear' },
    series: [measuredSeries(trace, from, to), ...(ring === null ? [] : [fittedSeries(ring, to)])],
    marks: [
      { kind: 'level', y: levels.base, label: 'base' },
      { kind: 'level', y: levels.top, label: 'top' },
      ...(ring === null ? [] : [frequencyMark(ring, to)]),
    ],
  }
}

function shownRange({ edge, ring, windowSeconds }: RingMeasurement): readonly [number, number] {
  const length =
    ring === null
      ? transitionsShown * edge.transitionSeconds
      : Math.min(cyclesShown, ring.cyclesUsed + 1) / ring.dampedFrequency
  const [start, end] = windowSeconds
  return [
    Math.max(start, edge.instantSeconds - edge.transitionSeconds - length / 8),
    Math.min(end, edge.instantSeconds + length),
  ]
}

function measuredSeries(trace: Trace, from: number, to: number): Series {
  const { values, startSeconds, intervalSeconds } = trace
  const samples = (to - from) / intervalSeconds + 3
  // A column of one sample draws as that sample, so twice as many fit.
  const columns = samples <= 2 * measuredColumns ? 2 * measuredColumns : measuredColumns
  const { x, min, max } = decimateMinMax(values, startSeconds, intervalSeconds, from, to, columns)
  const single = min.every((low, index) => low === max[index])
  return {
    id: 'measured',
    label: 'measured',
    role: 'measured',
    x: single ? x : x.flatMap((instant) => [instant, instant]),
    y: single ? min : min.flatMap((low, index) => [low, max[index] ?? low]),
  }
}

function fittedSeries({ fit, dampedFrequency }: Ring, to: number): Series {
  const end = Math.min(to, fit.endSeconds)
  const x = Array.from(
    { length: fittedPoints },
    (_, index) => fit.startSeconds + ((end - fit.startSeconds) * index) / (fittedPoints - 1),
  )
  return {
    id: 'fitted',
    label: 'fitted ring',
    role: 'computed',
    x,
    y: x.map((instant) => ringAt(fit, dampedFrequency, instant)),
  }
}

/** The fitted ring at an instant: level + amplitude · e^(−decayRate · t) · cos(2π f_d t + phase), t from its start. */
export function ringAt(fit: RingFit, dampedFrequency: number, instant: number): number {
  const time = instant - fit.startSeconds
  const angle = 2 * Math.PI * dampedFrequency * time + fit.phase
  return fit.level + fit.amplitude * Math.exp(-fit.decayRate * time) * Math.cos(angle)
}

/** Written at the crest of the second cycle, clear of the edge. */
function frequencyMark({ fit, dampedFrequency, dampingRatio }: Ring, to: number): Mark {
  const crest = fit.startSeconds + (1 - fit.phase / (2 * Math.PI)) / dampedFrequency
  const x = crest <= Math.min(to, fit.endSeconds) ? crest : fit.startSeconds
  const label = `${quantityText(dampedFrequency, 'Hz')}, ζ = ${formatQuantity(dampingRatio, '', 3).number}`
  return { kind: 'point', x, y: ringAt(fit, dampedFrequency, x), label }
}

function describe({
  edge,
  overshootFraction,
  overshootIsLowerBound,
  ring,
  ringAbsence,
}: RingMeasurement): string {
  const overshoot = `${overshootIsLowerBound ? 'at least ' : ''}${quantityText(100 * overshootFraction, '%', 3)}`
  const measured = `A ${edge.direction} edge of ${quantityText(edge.transitionSeconds, 's')} from 10 to 90 %, overshoot ${overshoot}.`
  if (ring === null) return `${measured} ${ringAbsence ?? ''}`.trim()
  return `${measured} It rings at ${quantityText(ring.dampedFrequency, 'Hz')} with a damping ratio of ${formatQuantity(ring.dampingRatio, '', 3).number}.`
}
