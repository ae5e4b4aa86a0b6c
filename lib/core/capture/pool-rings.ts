import type { Confidence, Ring } from '../ring/ring-measurement'
import type { AfterEdge } from './after-edge'
import type { Interval, PooledRing } from './capture-analysis'
import { deviationOf, medianOf } from './median'
import { ringDeviations } from './ring-uncertainty'
import { studentFactor } from './student-factor'

/** So many standard errors of the mean has the median of normal deviates. */
const medianExcess = 1.2533

type Pooling =
  { readonly ring: PooledRing; readonly absence: null } | { readonly ring: null; readonly absence: string }

/**
 * The ring of several edges: medians of frequency and damping with 95 % intervals, from the spread over the edges
 * (Student's factor) and at least from what the fits leave over. A ring that fewer than half of the edges show is none.
 */
export function poolRings(
  followed: readonly AfterEdge[],
  allEdges: number,
  intervalSeconds: number,
  noise: number,
): Pooling {
  const found = followed.flatMap(({ ring, tail }) => (ring === null ? [] : [{ ring, tail }]))
  const rings = found.map(({ ring }) => ring)
  if (rings.length === 0 || 2 * rings.length < followed.length) {
    return { ring: null, absence: commonAbsence(followed) }
  }
  const deviations = found.map(({ ring, tail }) => ringDeviations(ring, intervalSeconds, noise, tail))
  const fromFits = (pick: 'frequency' | 'dampingRatio') =>
    medianOf(deviations.map((deviation) => deviation?.[pick] ?? 0))
  const frequency = intervalOf(
    rings.map(({ dampedFrequency }) => dampedFrequency),
    fromFits('frequency'),
  )
  const damping = intervalOf(
    rings.map(({ dampingRatio }) => dampingRatio),
    fromFits('dampingRatio'),
  )
  const confidence = commonConfidence(rings)
  const cyclesUsed = medianOf(rings.map(({ cyclesUsed: cycles }) => cycles))
  return {
    absence: null,
    ring: {
      dampedFrequency: frequency,
      naturalFrequency: frequency.value / Math.sqrt(1 - damping.value ** 2),
      dampingRatio: { ...damping, low: Math.max(0, damping.low) },
      edgesUsed: rings.length,
      edgesTried: followed.length,
      cyclesUsed,
      confidence,
      statement: statementOf(rings.length, followed.length, allEdges, cyclesUsed),
    },
  }
}

function intervalOf(values: readonly number[], fitDeviation: number): Interval {
  const count = values.length
  const value = medianOf(values)
  const fromSpread =
    count < 2 ? 0 : (studentFactor(count - 1) * medianExcess * deviationOf(values)) / Math.sqrt(count)
  const half = Math.max(fromSpread, (1.96 * fitDeviation) / Math.sqrt(count))
  return { value, low: value - half, high: value + half }
}

function statementOf(used: number, tried: number, all: number, cycles: number): string {
  if (all === 1) return `Fitted to ${cycles} cycles after the one edge; the interval is that of the fit.`
  const chosen = tried === all ? `all ${all} edges` : `${tried} edges spread over the ${all} of the record`
  return `Median over ${used} rings found at ${chosen}, ${cycles} cycles each; the interval is that of the median.`
}

const order: readonly Confidence[] = ['low', 'medium', 'high']

function commonConfidence(rings: readonly Ring[]): Confidence {
  const ranks = rings.map(({ confidence }) => order.indexOf(confidence)).sort((a, b) => a - b)
  return order[ranks[ranks.length >> 1] ?? 0] ?? 'low'
}

/** The reason that most edges without a ring share. */
function commonAbsence(followed: readonly AfterEdge[]): string {
  const counts = new Map<string, number>()
  for (const { absence } of followed)
    if (absence !== null) counts.set(absence, (counts.get(absence) ?? 0) + 1)
  const [first] = [...counts].sort(([, a], [, b]) => b - a)
  return first?.[0] ?? 'No edge is followed by enough samples to look for a ring.'
}
