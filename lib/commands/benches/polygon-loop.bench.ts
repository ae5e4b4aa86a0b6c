import type { Point2 } from '@/lib/core/linear/point'
import { simplePolygon } from '@/lib/core/inductance/polygon'
import { contourOffsetLoop } from '@/lib/core/inductance/polygon-loop'

import type { BenchLine } from './bench-line'

const sides = 400
const repeats = 15
const goal = 50

/** A loop of 400 sides over a plane, from its corners to its inductance, checks included, on one core. */
export const polygonLoopBench = async (): Promise<readonly BenchLine[]> =>
  Promise.resolve([
    line('Loop of 400 sides over a plane, round', () => 0.02),
    line('Loop of 400 sides over a plane, jagged', (index) => (index % 2 === 0 ? 0.02 : 0.017)),
  ])

function line(name: string, radiusOf: (index: number) => number): BenchLine {
  const corners = Array.from({ length: sides }, (_, index) => cornerAt(index, radiusOf(index)))
  return {
    name,
    value: medianTime(corners),
    unit: 'ms',
    reference: null,
    goal,
    goalText: `at most ${goal} ms`,
  }
}

function cornerAt(index: number, radius: number): Point2 {
  const angle = (2 * Math.PI * index) / sides
  return [radius * Math.cos(angle), radius * Math.sin(angle)]
}

function medianTime(corners: readonly Point2[]): number {
  const times = Array.from({ length: repeats }, () => {
    const start = performance.now()
    const polygon = simplePolygon(corners)
    if (!polygon.ok) throw new Error(polygon.error.message)
    contourOffsetLoop(polygon.value, { meanDistance: 0.1e-3, imageDistance: 3.2e-3 })
    return performance.now() - start
  })
  return times.sort((a, b) => a - b)[Math.floor(repeats / 2)] ?? Number.NaN
}
