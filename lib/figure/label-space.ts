import type { Rect } from './layout'
import { clipSegment, type Point } from './polyline'

export const overlaps = (a: Rect, b: Rect): boolean =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height

export const contains = (outer: Rect, inner: Rect): boolean =>
  inner.x >= outer.x &&
  inner.y >= outer.y &&
  inner.x + inner.width <= outer.x + outer.width &&
  inner.y + inner.height <= outer.y + outer.height

/** How many units of width of `box` the runs cross, each run counted on its own. */
export const crossedWidth = (runs: readonly (readonly Point[])[], box: Rect): number => {
  let sum = 0
  for (const run of runs) {
    for (let index = 1; index < run.length; index += 1) {
      const a = run[index - 1]
      const b = run[index]
      if (!a || !b) continue
      if (Math.max(a[0], b[0]) < box.x || Math.min(a[0], b[0]) > box.x + box.width) continue
      const piece = clipSegment(a, b, box)
      if (piece) sum += Math.abs(piece[1][0] - piece[0][0]) + Math.abs(piece[1][1] - piece[0][1])
    }
  }
  return sum
}

/** Lowest and highest y of the runs between two positions, or null where there is no line. */
export const extentBetween = (
  runs: readonly (readonly Point[])[],
  from: number,
  to: number,
  plot: Rect,
): readonly [number, number] | null => {
  const band: Rect = { x: from, y: plot.y, width: to - from, height: plot.height }
  let low = Infinity
  let high = -Infinity
  for (const run of runs) {
    for (let index = 1; index < run.length; index += 1) {
      const a = run[index - 1]
      const b = run[index]
      if (!a || !b || Math.max(a[0], b[0]) < from || Math.min(a[0], b[0]) > to) continue
      const piece = clipSegment(a, b, band)
      if (!piece) continue
      low = Math.min(low, piece[0][1], piece[1][1])
      high = Math.max(high, piece[0][1], piece[1][1])
    }
  }
  return low <= high ? [low, high] : null
}
