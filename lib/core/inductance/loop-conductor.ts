import { err, ok, type Result } from '../result'
import { facingStripsMeanDistance, rectangleMeanDistance } from './mean-distance'
import { refusal, type InductanceRefusal } from './refusal'
import { solidMeanDistance, surfaceMeanDistance } from './round-conductor'

/** What a loop is made of, and how its current flows. Metres. */
export type LoopConductor =
  | { readonly kind: 'wireSurface' | 'wireUniform'; readonly radius: number }
  | { readonly kind: 'trace'; readonly width: number; readonly thickness: number }

/** Geometric mean distance of the conductor to itself, metres. */
export function meanDistanceOf(conductor: LoopConductor): number {
  switch (conductor.kind) {
    case 'wireSurface':
      return surfaceMeanDistance(conductor.radius)
    case 'wireUniform':
      return solidMeanDistance(conductor.radius)
    case 'trace':
      return rectangleMeanDistance(conductor.width, conductor.thickness)
  }
}

/** Its size across, metres. */
export const widthOf = (conductor: LoopConductor): number =>
  conductor.kind === 'trace' ? conductor.width : 2 * conductor.radius

/**
 * Geometric mean distance of the conductor to its mirror image in a plane, metres: twice the height of its middle, more
 * for a wide trace. Refused where the conductor touches the plane.
 */
export function imageDistanceOf(conductor: LoopConductor, height: number): Result<number, InductanceRefusal> {
  const half = conductor.kind === 'trace' ? conductor.thickness / 2 : conductor.radius
  if (!(height > half)) {
    return err(refusal('too_thick', 'The conductor touches the plane: the height is that of its middle.'))
  }
  const apart = 2 * height
  return ok(conductor.kind === 'trace' ? facingStripsMeanDistance(conductor.width, apart) : apart)
}
