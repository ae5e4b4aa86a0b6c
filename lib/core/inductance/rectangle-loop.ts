import { vacuumPermeability } from '../physics/constants'
import { barMutual, barSelf, barSelfApproximate, type Bar } from './bar'
import { rectangularLoop } from './loop'
import { alignedFilaments } from './parallel-filaments'
import { solidRoundSelf, tubeSelf } from './round-conductor'

/** A rectangle by its centre lines. Metres. */
export type Rectangle = { readonly width: number; readonly height: number }

/**
 * A rectangle as four partial inductances, 2 (L_W + L_H − M_W − M_H), henries, with the mutual inductances of the centre
 * lines. Corners are left out: they leave about 1 % open.
 */
function fourSides({ width, height }: Rectangle, selfOf: (length: number) => number): number {
  const mutuals = alignedFilaments(width, height) + alignedFilaments(height, width)
  return 2 * (selfOf(width) + selfOf(height) - mutuals)
}

/** Sides of round wire with all current on the surface, each exact, henries. */
export const rectangleOfTubes = (rectangle: Rectangle, radius: number): number =>
  fourSides(rectangle, (length) => tubeSelf(length, radius))

/** Sides of round wire with even current, each exact, henries. */
export const rectangleOfSolidWires = (rectangle: Rectangle, radius: number): number =>
  fourSides(rectangle, (length) => solidRoundSelf(length, radius))

/** Sides as two filaments the geometric mean distance of the conductor apart, henries. */
export const rectangleAtMeanDistance = (rectangle: Rectangle, meanDistance: number): number =>
  fourSides(rectangle, (length) => alignedFilaments(length, meanDistance))

/** Flat sides by the approximation for bars, henries. */
export const rectangleOfBarsApproximate = (
  rectangle: Rectangle,
  traceWidth: number,
  thickness: number,
): number => fourSides(rectangle, (length) => barSelfApproximate({ width: traceWidth, thickness, length }))

/** Flat sides in the plane of the loop, selfs and mutuals of the bars exact, henries. */
export function rectangleOfBars({ width, height }: Rectangle, traceWidth: number, thickness: number): number {
  const pairOf = (length: number, apart: number): number => {
    const bar: Bar = { width: traceWidth, thickness, length }
    return barSelf(bar) - barMutual(bar, bar, { across: apart, up: 0, along: 0 })
  }
  return 2 * (pairOf(width, height) + pairOf(height, width))
}

/**
 * Grover's rectangle of round wire with the term + 2r of Rosa and Grover, which counts the ends of the sides, henries:
 * the real ends give 0.9 r for even current and 1.27 r for surface current. Source: E. B. Rosa, F. W. Grover 1912 (from
 * memory).
 */
export const rectangleRosaGrover = ({ width, height }: Rectangle, radius: number): number =>
  rectangularLoop(width, height, radius, 'uniform') + (vacuumPermeability / Math.PI) * 2 * radius

/**
 * A wire at a height over a plane with both ends led down to it, henries: half of the rectangle l × 2h that it makes
 * with its mirror image, its sides two filaments the geometric mean distance apart.
 */
export const wireWithLegs = (length: number, height: number, meanDistance: number): number =>
  rectangleAtMeanDistance({ width: length, height: 2 * height }, meanDistance) / 2
