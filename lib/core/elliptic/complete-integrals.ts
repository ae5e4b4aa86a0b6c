/** What the arithmetic-geometric mean of 1 and k′ gives of both complete elliptic integrals, without cancellation. */
type Means = {
  /** K(k) */
  readonly first: number
  /** (K − E)/K − k²/2: what is left of the series of E after its first term. */
  readonly rest: number
}

/** Twice what the smallest complement that is a number takes. */
const mostRounds = 40

/**
 * K(k) = π / (2 agm(1, k′)) and E(k) = K (1 − Σ 2ⁿ⁻¹ cₙ²), c₀ = k. Both moduli are asked for, so that neither is lost
 * where it is small against the other. Source: NIST Digital Library of Mathematical Functions, 19.8(i).
 */
function means(modulus: number, complement: number): Means {
  let [a, b, c] = [1, complement, modulus]
  let [rest, weight] = [0, 0.5]
  if (!(b > 0)) return { first: Number.POSITIVE_INFINITY, rest: 0 }
  for (let round = 0; round < mostRounds && c > 1e-17 * a; round += 1) {
    const next = (a + b) / 2
    c = (c * c) / (4 * next)
    b = Math.sqrt(a * b)
    a = next
    weight *= 2
    rest += weight * c * c
  }
  return { first: Math.PI / (2 * a), rest }
}

const complementOf = (modulus: number): number => Math.sqrt((1 - modulus) * (1 + modulus))

/** The complete elliptic integral of the first kind, K(k), of the modulus 0 ≤ k < 1. Source: NIST DLMF 19.8. */
export const completeK = (modulus: number, complement = complementOf(modulus)): number =>
  means(modulus, complement).first

/** The complete elliptic integral of the second kind, E(k), of the modulus 0 ≤ k ≤ 1. Source: NIST DLMF 19.8. */
export function completeE(modulus: number, complement = complementOf(modulus)): number {
  if (complement === 0) return 1
  const { first, rest } = means(modulus, complement)
  return first * (1 - modulus ** 2 / 2 - rest)
}

/** (1 − k²/2) K(k) − E(k), without the cancellation that the difference has for a small modulus: ≈ π k⁴/32. */
export function completeDifference(modulus: number, complement: number): number {
  const { first, rest } = means(modulus, complement)
  return first * rest
}
