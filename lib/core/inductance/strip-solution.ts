import { vacuumPermeability } from '../physics/constants'
import { solvePositive } from './solve-positive'

/** From this ratio of width to height on, the expansion for wide strips takes over. */
const wideFrom = 60

/**
 * A strip without thickness over a perfect plane, its current free to crowd at the edges, H/m: the field of the strip
 * and of its image is constant along the strip,
 *
 *     (µ₀/4π) ∫ J(x′) ln[((x − x′)² + 4h²)/(x − x′)²] dx′ = Φ′,   L′ = Φ′/I
 *
 * solved at Chebyshev points, where the logarithm is summed in closed form and the error falls exponentially. To about
 * 1e-9 for u = w/h up to 60; above it by the expansion for wide strips, within 2e-5 there,
 *
 *     L′ = µ₀ / [u + (2/π)(1 + λ) + (4/π²)(½ + λ)/u],   λ = ln πu
 *
 * Derived here. The first two terms are Kirchhoff's of 1877 for the plate capacitor (from memory); the third is fitted to
 * the solution.
 */
export function stripOverPlaneExact(width: number, height: number): number {
  const ratio = width / height
  if (ratio >= wideFrom) {
    const logarithm = Math.log(Math.PI * ratio)
    const edges = (2 / Math.PI) * (1 + logarithm) + ((2 / Math.PI) ** 2 * (1 / 2 + logarithm)) / ratio
    return vacuumPermeability / (ratio + edges)
  }
  const half = 16 + Math.ceil(3 * ratio)
  const currents = solvePositive(stripMatrix(half, 4 / ratio), new Float64Array(half).fill(1))
  const total = currents.reduce((sum, current) => sum + current, 0)
  return vacuumPermeability / (4 * Math.PI) / total
}

/** Flux per current between pairs of points mirrored about the middle of the strip; 2·half points in all. */
function stripMatrix(half: number, image: number): readonly Float64Array[] {
  const count = 2 * half
  const series = cosineSums(count)
  const angleOf = (index: number): number => ((index + 0.5) * Math.PI) / count
  const flux = (i: number, j: number): number => {
    const apart = Math.cos(angleOf(i)) - Math.cos(angleOf(j))
    const direct = 2 * Math.LN2 + 2 * ((series[Math.abs(i - j)] ?? 0) + (series[i + j + 1] ?? 0))
    return Math.log(apart ** 2 + image ** 2) + direct
  }
  return Array.from({ length: half }, (_, i) =>
    Float64Array.from({ length: half }, (_row, j) => (flux(i, j) + flux(i, count - 1 - j)) / 2),
  )
}

/** Σ cos(nkπ/N)/n over n = 1…N − 1, for k = 0…2N: what −ln|x − x′| is made of at Chebyshev points. */
function cosineSums(count: number): Float64Array {
  return Float64Array.from({ length: 2 * count + 1 }, (_, k) => {
    let sum = 0
    for (let n = 1; n < count; n += 1) sum += Math.cos(((n * k) % (2 * count)) * (Math.PI / count)) / n
    return sum
  })
}
