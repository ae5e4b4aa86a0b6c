import { line } from 'd3-shape'

import type { Rect } from './layout'

export type Point = readonly [number, number]

/** The part of the segment a-b inside the rectangle, or null (Liang and Barsky, ACM Trans. Graphics 3(1), 1984). */
export const clipSegment = (a: Point, b: Point, rect: Rect): readonly [Point, Point] | null => {
  const dx = b[0] - a[0]
  const dy = b[1] - a[1]
  const edges: readonly (readonly [number, number])[] = [
    [-dx, a[0] - rect.x],
    [dx, rect.x + rect.width - a[0]],
    [-dy, a[1] - rect.y],
    [dy, rect.y + rect.height - a[1]],
  ]
  let enter = 0
  let leave = 1
  for (const [direction, distance] of edges) {
    if (direction === 0) {
      if (distance < 0) return null
    } else if (direction < 0) {
      enter = Math.max(enter, distance / direction)
    } else {
      leave = Math.min(leave, distance / direction)
    }
  }
  if (enter > leave) return null
  // An end inside the plot is kept to the last bit, so that consecutive pieces join into one run.
  return [
    enter === 0 ? a : [a[0] + enter * dx, a[1] + enter * dy],
    leave === 1 ? b : [a[0] + leave * dx, a[1] + leave * dy],
  ]
}

const isSame = (a: Point | undefined, b: Point) => a !== undefined && a[0] === b[0] && a[1] === b[1]

/** The runs of a polyline inside the rectangle; `null` points break it. */
export const clipPolyline = (points: readonly (Point | null)[], rect: Rect): Point[][] => {
  const runs: Point[][] = []
  let run: Point[] = []
  let previous: Point | null = null
  for (const point of points) {
    const piece = previous && point ? clipSegment(previous, point, rect) : null
    if (piece) {
      if (!isSame(run.at(-1), piece[0])) {
        run = [piece[0]]
        runs.push(run)
      }
      run.push(piece[1])
    }
    previous = point
  }
  return runs
}

const toPath = line<Point>()
  .x((point) => point[0])
  .y((point) => point[1])
  .digits(2)

/** SVG path data of the runs, to a hundredth of a layout unit. */
export const pathOf = (runs: readonly (readonly Point[])[]): string =>
  runs.map((run) => toPath([...run]) ?? '').join('')
