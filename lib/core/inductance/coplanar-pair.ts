import { completeK } from '../elliptic/complete-integrals'
import { vacuumPermeability } from '../physics/constants'
import { tanhSinh } from './tanh-sinh'

/** Two thin strips side by side in one plane; current goes out on one and back on the other. Metres. */
export type CoplanarPair = { readonly width1: number; readonly width2: number; readonly gap: number }

/**
 * The pair with its current at the edges (skin and proximity effect), zero thickness, H/m:
 *
 *     L′ = (µ₀/2) K(k)/K(k′),   k² = s (s + w₁ + w₂) / ((s + w₁)(s + w₂))
 *
 * Exact, by conformal mapping; for equal widths the same as µ₀ K(q)/K(q′), q = s/(s + 2w). Derived here.
 */
export function coplanarPair({ width1, width2, gap }: CoplanarPair): number {
  const [reach1, reach2] = [gap + width1, gap + width2]
  const modulus = Math.sqrt((gap / reach1) * ((gap + width1 + width2) / reach2))
  const complement = Math.sqrt((width1 / reach1) * (width2 / reach2))
  return ((vacuumPermeability / 2) * completeK(modulus, complement)) / completeK(complement, modulus)
}

/**
 * The pair with even current over both widths, H/m: L′ = (µ₀/2π) (2 ln g₁₂ − ln g₁ − ln g₂), with the geometric mean
 * distances g of the strips to each other and to themselves, ln g = ln w − 3/2. Source: J. C. Maxwell, A Treatise on
 * Electricity and Magnetism, art. 691–693 (from memory).
 */
export function coplanarPairUniform(pair: CoplanarPair): number {
  const own = Math.log(pair.width1) + Math.log(pair.width2) - 3
  return (vacuumPermeability / (2 * Math.PI)) * (2 * logMutualDistance(pair) - own)
}

/** ln of the geometric mean distance of two collinear strips: the exact mean over the wider, averaged over the other. */
function logMutualDistance({ width1, width2, gap }: CoplanarPair): number {
  const [narrow, wide] = width1 < width2 ? [width1, width2] : [width2, width1]
  const total = tanhSinh(gap, gap + narrow, (x) => Math.log(x) + logMeanBeyond(wide / x))
  return total / narrow
}

/** Mean of ln(1 + q s) over s = 0…1: ((1 + q) ln(1 + q))/q − 1, by its series where that cancels. */
const logMeanBeyond = (q: number): number =>
  q > 1e-2
    ? ((1 + q) * Math.log1p(q)) / q - 1
    : q * (1 / 2 - q * (1 / 6 - q * (1 / 12 - q * (1 / 20 - q / 30))))
