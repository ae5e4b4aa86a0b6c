import type { Bar, BarOffset } from '@/lib/core/inductance/bar'

/**
 * Mutual inductance of two parallel bars by the closed form of 64 terms. Source: C. Hoer, C. Love, J. Res. NBS 69C
 * (1965) 127 (from memory). Loses digits for long thin bars, so only for the comparison of short ones.
 */
export function hoerLove(first: Bar, second: Bar, offset: BarOffset): number {
  const corners = (a: number, b: number, shift: number): readonly number[] => [
    shift - a,
    shift + b - a,
    shift + b,
    shift,
  ]
  const xs = corners(first.width, second.width, offset.across)
  const ys = corners(first.thickness, second.thickness, offset.up)
  const zs = corners(first.length, second.length, offset.along)
  let sum = 0
  for (const [i, x] of xs.entries())
    for (const [j, y] of ys.entries())
      for (const [k, z] of zs.entries()) sum += (-1) ** (i + j + k + 1) * primitive(x, y, z)
  return (-1e-7 * sum) / (first.width * first.thickness * second.width * second.thickness)
}

function primitive(x: number, y: number, z: number): number {
  const distance = Math.hypot(x, y, z)
  const powers = x ** 4 + y ** 4 + z ** 4 - 3 * (x * y) ** 2 - 3 * (y * z) ** 2 - 3 * (z * x) ** 2
  return (
    logTerm(x, y, z) +
    logTerm(y, x, z) +
    logTerm(z, x, y) +
    (powers * distance) / 60 -
    arcTerm(x, y, z, distance) -
    arcTerm(x, z, y, distance) -
    arcTerm(y, z, x, distance)
  )
}

/** (a²b²/4 − a⁴/24 − b⁴/24) x asinh(x/√(a² + b²)). */
function logTerm(x: number, a: number, b: number): number {
  const aside = Math.hypot(a, b)
  if (aside === 0) return 0
  return ((a * b) ** 2 / 4 - a ** 4 / 24 - b ** 4 / 24) * x * Math.asinh(x / aside)
}

/** (a b c³/6) atan(ab/(cR)). */
const arcTerm = (a: number, b: number, c: number, distance: number): number =>
  c === 0 ? 0 : ((a * b * c ** 3) / 6) * Math.atan((a * b) / (c * distance))
