/** Ends of an interval. */
export type Interval = { readonly low: number; readonly high: number }

/**
 * The probabilistically symmetric interval that holds a part `coverage` of the draws (JCGM 101:2008, 7.7): between the
 * draws of rank (1 − coverage)/2 and (1 + coverage)/2. Sorts the draws in place.
 */
export function coverageInterval(draws: Float64Array, coverage: number): Interval {
  draws.sort()
  const inside = Math.floor(coverage * draws.length + 0.5)
  const below = Math.floor((draws.length - inside) / 2 + 0.5)
  const low = draws[below] ?? 0
  return { low, high: draws[Math.min(below + inside, draws.length - 1)] ?? low }
}

/** The squared correlation of two columns of draws: the part of the variance that one explains of the other. */
export function explainedVariance(cause: Float64Array, effect: Float64Array): number {
  const meanCause = meanOf(cause)
  const meanEffect = meanOf(effect)
  let both = 0
  let ofCause = 0
  let ofEffect = 0
  for (let index = 0; index < cause.length; index += 1) {
    const a = (cause[index] ?? 0) - meanCause
    const b = (effect[index] ?? 0) - meanEffect
    both += a * b
    ofCause += a * a
    ofEffect += b * b
  }
  const share = (both / ofCause) * (both / ofEffect)
  return Number.isFinite(share) ? share : 0
}

const meanOf = (values: Float64Array): number => values.reduce((sum, value) => sum + value, 0) / values.length
