import { complex, type Complex } from './complex'
import type { Polynomial } from './polynomial'

/**
 * The roots of a polynomial of degree 1 to 3 with real coefficients: one real root by bisection and Newton's method,
 * the rest by the quadratic formula in its form without cancellation.
 */
export function rootsOf(polynomial: Polynomial): readonly Complex[] {
  const [c0 = 0, c1 = 0, c2 = 0, c3 = 0] = polynomial
  if (c3 !== 0) {
    const real = realRootOfCubic(c0 / c3, c1 / c3, c2 / c3)
    return [complex(real), ...quadraticRoots(deflate(c0 / c3, c1 / c3, c2 / c3, real))]
  }
  if (c2 !== 0) return quadraticRoots([c0 / c2, c1 / c2])
  return c1 === 0 ? [] : [complex(-c0 / c1)]
}

/** x² + b x + c, as [c, b], after taking the root out of x³ + a2 x² + a1 x + a0. */
function deflate(a0: number, a1: number, a2: number, root: number): readonly [number, number] {
  const b = a2 + root
  // Of the two equal ways to the last coefficient, the one without cancellation.
  const c = Math.abs(root) > 1e-30 && Math.abs(a0 / root) < Math.abs(root * b) ? -a0 / root : a1 + root * b
  return [c, b]
}

function realRootOfCubic(a0: number, a1: number, a2: number): number {
  const at = (x: number) => ((x + a2) * x + a1) * x + a0
  // Cauchy's bound holds every root.
  const bound = 1 + Math.max(Math.abs(a0), Math.abs(a1), Math.abs(a2))
  let low = -bound
  let high = bound
  for (let step = 0; step < 200 && high - low > 1e-16 * bound; step += 1) {
    const middle = (low + high) / 2
    if (at(middle) > 0) high = middle
    else low = middle
  }
  let root = (low + high) / 2
  for (let step = 0; step < 50; step += 1) {
    const slope = (3 * root + 2 * a2) * root + a1
    if (slope === 0) break
    const next = root - at(root) / slope
    if (!(Math.abs(at(next)) < Math.abs(at(root)))) break
    root = next
  }
  return root
}

function quadraticRoots([c, b]: readonly [number, number]): readonly [Complex, Complex] {
  const discriminant = b * b - 4 * c
  if (discriminant < 0) {
    const im = Math.sqrt(-discriminant) / 2
    return [complex(-b / 2, im), complex(-b / 2, -im)]
  }
  const q = -(b + (b < 0 ? -1 : 1) * Math.sqrt(discriminant)) / 2
  return q === 0 ? [complex(0), complex(0)] : [complex(q), complex(c / q)]
}
