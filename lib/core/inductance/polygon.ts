import { err, ok, type Result } from '../result'
import type { Point2, Side } from '../linear/point'
import { refusal, type InductanceRefusal } from './refusal'
import { separationSquared } from './segment-distance'

/** A closed outline of at least three corners that neither crosses nor touches itself. Metres. */
export type Polygon = {
  readonly corners: readonly Point2[]
  /** Enclosed, m², whichever way round the corners run. */
  readonly area: number
  readonly perimeter: number
}

export const sidesOf = (corners: readonly Point2[]): readonly Side[] =>
  corners.map((from, index) => ({ from, to: corners[(index + 1) % corners.length] ?? from }))

const lengthOf = ({ from, to }: Side): number => Math.hypot(to[0] - from[0], to[1] - from[1])

/**
 * Takes corners as a simple polygon, concave or convex, in either direction. Refused with the number of the corner or
 * of the sides at fault, counted from 1: fewer than three corners, numbers that are not finite, sides without length,
 * sides that fold back, cross or touch.
 */
export function simplePolygon(corners: readonly Point2[]): Result<Polygon, InductanceRefusal> {
  if (corners.length < 3) return err(refusal('too_few_points', 'A loop needs at least three corners.'))
  const broken = corners.findIndex((corner) => !corner.every(Number.isFinite))
  if (broken >= 0)
    return err(refusal('not_finite', `Corner ${broken + 1} has a coordinate that is no number.`))
  const sides = sidesOf(corners)
  const perimeter = sides.reduce((sum, side) => sum + lengthOf(side), 0)
  const short = sides.findIndex((side) => !(lengthOf(side) > 1e-12 * perimeter))
  if (short >= 0) {
    const next = ((short + 1) % corners.length) + 1
    return err(refusal('zero_length', `Corners ${short + 1} and ${next} are at the same place.`))
  }
  const meeting = sidesThatMeet(sides, perimeter)
  if (meeting !== null) {
    return err(refusal('self_intersecting', `Sides ${meeting[0]} and ${meeting[1]} cross or touch.`))
  }
  const area = Math.abs(signedArea(corners))
  if (!(area > 0) || !Number.isFinite(perimeter)) return err(refusal('no_area', 'The loop encloses no area.'))
  return ok({ corners, area, perimeter })
}

/** Counted from the first corner, so that a loop far from the origin loses no digits. */
function signedArea(corners: readonly Point2[]): number {
  const [x0, y0] = corners[0] ?? [0, 0]
  const twice = sidesOf(corners).reduce(
    (sum, { from, to }) => sum + (from[0] - x0) * (to[1] - y0) - (to[0] - x0) * (from[1] - y0),
    0,
  )
  return twice / 2
}

function sidesThatMeet(sides: readonly Side[], perimeter: number): readonly [number, number] | null {
  const tooNear = (1e-12 * perimeter) ** 2
  const last = sides.length - 1
  for (const [i, first] of sides.entries()) {
    for (let j = i + 1; j <= last; j += 1) {
      const second = sides[j]
      if (second === undefined) continue
      const isNext = j === i + 1 || (i === 0 && j === last)
      const isMeeting = isNext
        ? isFoldedBack(j === i + 1 ? first : second, j === i + 1 ? second : first, perimeter)
        : separationSquared(first, second) <= tooNear
      if (isMeeting) return [i + 1, j + 1]
    }
  }
  return null
}

/** Whether a side runs back over the one before it: then one of their free ends lies on the other side. */
function isFoldedBack(first: Side, second: Side, perimeter: number): boolean {
  const [ax, ay] = [first.to[0] - first.from[0], first.to[1] - first.from[1]]
  const [bx, by] = [second.to[0] - second.from[0], second.to[1] - second.from[1]]
  if (ax * bx + ay * by >= 0) return false
  const away = Math.abs(ax * by - ay * bx) / Math.max(Math.hypot(ax, ay), Math.hypot(bx, by))
  return away <= 1e-12 * perimeter
}
