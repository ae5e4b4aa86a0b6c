/**
 * Geometric mean distance of the points of a rectangle to each other, metres:
 *
 *     ln g = ½ ln(w² + t²) − (w²/12t²) ln(1 + t²/w²) − (t²/12w²) ln(1 + w²/t²) + (2w/3t) atan(t/w) + (2t/3w) atan(w/t) − 25/12
 *
 * about 0.2235 (w + t) for every shape. Source: J. C. Maxwell, A Treatise on Electricity and Magnetism, art. 692 (from
 * memory).
 */
export function rectangleMeanDistance(width: number, thickness: number): number {
  const q = Math.min(width, thickness) / Math.max(width, thickness)
  const square = q * q
  // For the flat side the two terms cancel: (1/12q²) ln(1 + q²) goes to 1/12, (2/3q) atan q to 2/3.
  const flat = q < 1e-4 ? 1 / 12 - square / 24 : Math.log1p(square) / (12 * square)
  const steep = (square / 12) * Math.log1p(1 / square)
  const arcs = (2 / 3) * (q < 1e-4 ? 1 - square / 3 : Math.atan(q) / q) + ((2 * q) / 3) * Math.atan(1 / q)
  const logarithm = Math.log1p(square) / 2 - flat - steep + arcs - 25 / 12
  return Math.max(width, thickness) * Math.exp(logarithm)
}

/**
 * Geometric mean distance of two equal thin strips that face each other, metres: with p = apart/width,
 *
 *     ln g = ln w + ½ (1 − p²) ln(1 + p²) + p² ln p + 2 p atan(1/p) − 3/2
 *
 * Source: E. B. Rosa, Bulletin of the Bureau of Standards 3 (1907) 1 (from memory).
 */
export function facingStripsMeanDistance(width: number, apart: number): number {
  const p = apart / width
  if (p > 50) return apart * Math.exp(1 / (12 * p * p))
  const logarithm =
    ((1 - p * p) / 2) * Math.log1p(p * p) + p * p * Math.log(p) + 2 * p * Math.atan(1 / p) - 3 / 2
  return width * Math.exp(logarithm)
}
