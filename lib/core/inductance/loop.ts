import { vacuumPermeability } from '../physics/constants'

/** Where the current flows: on the surface (skin effect) or evenly over the cross-section. */
export type CurrentModel = 'surface' | 'uniform'

/** The inductance inside a round wire, as the number that the formulas hold: µ₀/8π a metre for uniform current. */
const internalTerm = (model: CurrentModel): number => (model === 'surface' ? 0 : 1 / 4)

/**
 * A circular loop of round wire: L = µ₀ a (ln(8a/r) − 2 + Y), Y = 0 or ¼. Metres, henries. For r/a = 0.05, 0.1 and
 * 0.2 a perfect conductor has 0.3, 1.1 and 4.1 % less than the surface form. Source: J. C. Maxwell, 1865, art. 113.
 */
export const circularLoop = (radius: number, wireRadius: number, model: CurrentModel): number =>
  vacuumPermeability * radius * (Math.log((8 * radius) / wireRadius) - 2 + internalTerm(model))

/**
 * The same for even current to the second order of r/a: µ₀ a {ln(8a/r) − 7/4 + (r²/8a²)[ln(8a/r) + 1/3]}, henries; to
 * 3e-6 at r/a = 0.2. Source: Lord Rayleigh, W. D. Niven 1881, in E. B. Rosa, F. W. Grover, Bulletin of the Bureau of
 * Standards 8 (1912) 1 (from memory).
 */
export function circularLoopSecondOrder(radius: number, wireRadius: number): number {
  const logarithm = Math.log((8 * radius) / wireRadius)
  const second = ((wireRadius / radius) ** 2 / 8) * (logarithm + 1 / 3)
  return vacuumPermeability * radius * (logarithm - 7 / 4 + second)
}

/**
 * A rectangular loop of round wire with centre lines W × H and diagonal D, Y = 0 or ¼:
 *
 *     L = µ₀/π · [(W + H) ln(2WH/r) − W ln(W + D) − H ln(H + D) − (2 − Y)(W + H) + 2D]
 *
 * Metres, henries. Corners leave about 1 % open. Source: F. W. Grover, Inductance Calculations, 1946 (from memory).
 */
export function rectangularLoop(
  width: number,
  height: number,
  wireRadius: number,
  model: CurrentModel,
): number {
  const diagonal = Math.hypot(width, height)
  const bracket =
    (width + height) * Math.log((2 * width * height) / wireRadius) -
    width * Math.log(width + diagonal) -
    height * Math.log(height + diagonal) -
    (2 - internalTerm(model)) * (width + height) +
    2 * diagonal
  return (vacuumPermeability / Math.PI) * bracket
}

/** The radius of a thin wire that has the inductance of a flat trace: its geometric mean distance, 0.2235 (w + t). */
export const equivalentRadius = (traceWidth: number, thickness: number): number =>
  0.2235 * (traceWidth + thickness)
