import { vacuumPermeability } from '../physics/constants'
import { err, ok, type Result } from '../result'
import { alignedFilaments } from './parallel-filaments'
import { planarPair, planarSide, type Copy } from './planar-pair'
import { sidesOf, type Polygon } from './polygon'
import { refusal, type InductanceRefusal } from './refusal'

const perFourPi = vacuumPermeability / (4 * Math.PI)

/** A loop parallel to a plane: the distance of the conductor's copy, and that of its mirror image. Metres. */
export type LoopHeights = { readonly meanDistance: number; readonly imageDistance?: number }

/**
 * Inductance of a polygon by its contour and a copy of it, displaced by the geometric mean distance g of the conductor
 * normal to its plane, henries: L = (µ₀/4π) Σᵢⱼ ∬ cos ε ds dt / R(g). With a plane, the mirror image at twice the
 * height is taken away. Does not depend on how sides are subdivided, on the direction or on the first corner; corners
 * leave about 1 % open. Derived here from the Neumann integral.
 */
export function contourOffsetLoop(polygon: Polygon, { meanDistance, imageDistance }: LoopHeights): number {
  const free: Copy = { height: meanDistance, sign: 1 }
  return perFourPi * pairSum(polygon, imageDistance === undefined ? [free] : [free, imageAt(imageDistance)])
}

/** Mutual inductance of a loop and a copy of it, displaced normal to its plane, henries: so that of its mirror image. */
export const mutualWithCopy = (polygon: Polygon, distance: number): number =>
  perFourPi * pairSum(polygon, [{ height: distance, sign: 1 }])

const imageAt = (height: number): Copy => ({ height, sign: -1 })

/**
 * The same loop as a sum of partial inductances, henries: each side as two filaments the geometric mean distance apart,
 * and the mutual inductances of the centre lines. Grows where sides are subdivided, by 4 % for a circle of 24 pieces.
 */
export function partialSumLoop(polygon: Polygon, meanDistance: number): number {
  const sides = sidesOf(polygon.corners).map(planarSide)
  const selves = sides.reduce((sum, { half }) => sum + alignedFilaments(2 * half, meanDistance), 0)
  const centre: readonly Copy[] = [{ height: 0, sign: 1 }]
  let mutuals = 0
  for (const [i, a] of sides.entries()) {
    for (const b of sides.slice(i + 1)) mutuals += planarPair(a, b, centre)
  }
  return selves + 2 * perFourPi * mutuals
}

function pairSum(polygon: Polygon, copies: readonly Copy[]): number {
  const sides = sidesOf(polygon.corners).map(planarSide)
  let [own, mutual] = [0, 0]
  for (const [i, a] of sides.entries()) {
    own += planarPair(a, a, copies)
    for (let j = i + 1; j < sides.length; j += 1) {
      const b = sides[j]
      if (b !== undefined) mutual += planarPair(a, b, copies)
    }
  }
  return own + 2 * mutual
}

/**
 * Makes sure that a conductor fits a loop: its geometric mean distance stays below area over perimeter, which is half
 * the gap of a long narrow loop and half the radius of a circle, and, with a plane, below the height.
 */
export function conductorFits(
  polygon: Polygon,
  meanDistance: number,
  height?: number,
): Result<null, InductanceRefusal> {
  if (!(meanDistance > 0 && Number.isFinite(meanDistance)))
    return err(refusal('not_positive', 'The conductor needs a size above 0.'))
  if (meanDistance >= polygon.area / polygon.perimeter)
    return err(refusal('too_thick', 'The conductor is too thick for this loop: it would fill it.'))
  if (height === undefined) return ok(null)
  if (!(height > 0 && Number.isFinite(height)))
    return err(refusal('not_positive', 'The height over the plane must be above 0.'))
  if (meanDistance >= height) return err(refusal('too_thick', 'The conductor touches the plane: raise it.'))
  return ok(null)
}
