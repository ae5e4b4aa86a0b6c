import { vacuumPermeability } from '../physics/constants'
import { err, ok, type Result } from '../result'
import { filamentQuadrature, type Filament } from './filament-quadrature'
import { areOverlapping, parallelFilaments } from './parallel-filaments'
import { cross, difference, dot, norm, scaled, type Point3 } from '../linear/point'
import { refusal, type InductanceRefusal } from './refusal'
import { skewClosedForm } from './skew-filaments'

/** A straight piece of a thin conductor; current flows from start to end. Metres. */
export type Segment = { readonly start: Point3; readonly end: Point3 }

/** Below this sine of their angle, lines count as parallel: what is neglected is of its square. */
const parallelBelow = 1e-12
/** Below this one, the closed form would lose more than the quadrature does. */
const nearlyParallelBelow = 0.01

/**
 * Mutual inductance of two straight filaments anywhere in space, henries: M = (µ₀/4π) ∬ cos ε ds dt / R. Positive where
 * the currents run the same way, negative where they run against each other, 0 at a right angle. Filaments may touch
 * and cross; refused where they overlap on one line, as the integral diverges. To about 1e-10.
 */
export function filamentMutual(a: Segment, b: Segment): Result<number, InductanceRefusal> {
  if (![...a.start, ...a.end, ...b.start, ...b.end].every(Number.isFinite))
    return err(refusal('not_finite', 'Every coordinate must be a finite number.'))
  const first = filamentOf(a)
  const second = filamentOf(b)
  if (!(first.length > 0 && second.length > 0))
    return err(refusal('zero_length', 'A segment needs two different ends.'))
  const mutual = (vacuumPermeability / (4 * Math.PI)) * neumannIntegral(first, second)
  return Number.isFinite(mutual)
    ? ok(mutual)
    : err(
        refusal('overlap', 'The segments overlap on one line: their mutual inductance has no finite value.'),
      )
}

export function filamentOf({ start, end }: Segment): Filament {
  const along = difference(end, start)
  const length = norm(along)
  return { start, direction: scaled(along, 1 / length), length }
}

/** ∬ cos ε ds dt / R of two filaments, metres; infinite where they overlap on one line. */
export function neumannIntegral(first: Filament, second: Filament): number {
  const cosine = dot(first.direction, second.direction)
  const normal = cross(first.direction, second.direction)
  const sine = norm(normal)
  if (sine < parallelBelow) return parallel(first, second, cosine)
  if (cosine === 0) return 0
  if (sine < nearlyParallelBelow) return filamentQuadrature(first, second)
  const between = difference(first.start, second.start)
  const [onFirst, onSecond] = [dot(between, first.direction), dot(between, second.direction)]
  const p0 = (onFirst - cosine * onSecond) / sine ** 2
  const q0 = (cosine * onFirst - onSecond) / sine ** 2
  const apart = Math.abs(dot(between, normal)) / sine
  return skewClosedForm({ p0, p1: p0 + first.length, q0, q1: q0 + second.length, cosine, sine, apart })
}

function parallel(first: Filament, second: Filament, cosine: number): number {
  const between = difference(second.start, first.start)
  const along = dot(between, first.direction)
  const aside = norm(difference(between, scaled(first.direction, along)))
  const extent = first.length + second.length + Math.abs(along)
  const pair = {
    length1: first.length,
    length2: second.length,
    distance: aside > 1e-13 * extent ? aside : 0,
    offset: cosine > 0 ? along : along - second.length,
  }
  if (areOverlapping(pair)) return Number.POSITIVE_INFINITY
  return (Math.sign(cosine) * parallelFilaments(pair) * 4 * Math.PI) / vacuumPermeability
}
