import type { Point2, Side } from '../linear/point'

/** Square of the distance of two line pieces in a plane; 0 where they cross or touch. Quick where they are far apart. */
export function separationSquared(a: Side, b: Side): number {
  if (areCrossing(a, b)) return 0
  return Math.min(
    toSideSquared(a.from, b),
    toSideSquared(a.to, b),
    toSideSquared(b.from, a),
    toSideSquared(b.to, a),
  )
}

const turn = (a: Point2, b: Point2, c: Point2): number =>
  (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0])

function areCrossing(a: Side, b: Side): boolean {
  const around = Math.sign(turn(a.from, a.to, b.from)) * Math.sign(turn(a.from, a.to, b.to))
  if (around > 0) return false
  const across = Math.sign(turn(b.from, b.to, a.from)) * Math.sign(turn(b.from, b.to, a.to))
  return around < 0 && across < 0
}

function toSideSquared(point: Point2, { from, to }: Side): number {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]]
  const along = ((point[0] - from[0]) * dx + (point[1] - from[1]) * dy) / (dx * dx + dy * dy)
  const at = Math.min(1, Math.max(0, along))
  return (point[0] - from[0] - at * dx) ** 2 + (point[1] - from[1] - at * dy) ** 2
}
