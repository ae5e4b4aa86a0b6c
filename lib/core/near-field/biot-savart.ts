import { err, ok, type Result } from '../result'
import { cross, difference, dot, norm, type Point3 } from '../linear/point'

export type FieldRefusal = {
  readonly code: 'too_few_points' | 'side_without_length' | 'on_the_wire'
  readonly message: string
}

/** Nearer to the wire than this part of a side, the field of a thin wire has no meaning. */
const nearest = 1e-9

/**
 * The magnetic field of a current around a closed polygon of thin wire, in A/m, by the law of Biot and Savart. Each side
 * from a to b gives, with u = a − P and v = b − P,
 *
 *     H = (I/4π) (u × v) (|u| + |v|) / (|u| |v| (|u| |v| + u·v)),
 *
 * which is I/(4πd)(cos α₁ − cos α₂) without its cancellation. Metres, amperes; static, or distances far below λ.
 * Errors: fewer than three points, a side without length, a point on the wire.
 */
export function polygonField(
  points: readonly Point3[],
  current: number,
  at: Point3,
): Result<Point3, FieldRefusal> {
  if (points.length < 3) return err(tooFewPoints)
  let field: Point3 = [0, 0, 0]
  for (const [index, start] of points.entries()) {
    const end = points[(index + 1) % points.length] ?? start
    const side = norm(difference(end, start))
    if (side === 0) return err(sideWithoutLength(index))
    if (distanceToSide(start, end, at) < nearest * side) return err(onTheWire)
    const [x, y, z] = sideField(start, end, current, at)
    field = [field[0] + x, field[1] + y, field[2] + z]
  }
  return ok(field)
}

function sideField(start: Point3, end: Point3, current: number, at: Point3): Point3 {
  const [u, v] = [difference(start, at), difference(end, at)]
  const [lengthU, lengthV] = [norm(u), norm(v)]
  const scale =
    (current * (lengthU + lengthV)) / (4 * Math.PI * lengthU * lengthV * (lengthU * lengthV + dot(u, v)))
  const [x, y, z] = cross(u, v)
  // In line with the side both the product and the denominator may vanish; there the side gives nothing.
  return x === 0 && y === 0 && z === 0 ? [0, 0, 0] : [scale * x, scale * y, scale * z]
}

function distanceToSide(start: Point3, end: Point3, at: Point3): number {
  const side = difference(end, start)
  const along = dot(difference(at, start), side) / dot(side, side)
  const share = Math.min(1, Math.max(0, along))
  const foot: Point3 = [start[0] + share * side[0], start[1] + share * side[1], start[2] + share * side[2]]
  return norm(difference(at, foot))
}

const tooFewPoints: FieldRefusal = {
  code: 'too_few_points',
  message: 'A loop needs at least three corners.',
}

const sideWithoutLength = (index: number): FieldRefusal => ({
  code: 'side_without_length',
  message: `Side ${index + 1} of the loop has no length; take the doubled corner out.`,
})

const onTheWire: FieldRefusal = {
  code: 'on_the_wire',
  message: 'The point lies on the wire, where the field of a thin wire is infinite; move it away.',
}
