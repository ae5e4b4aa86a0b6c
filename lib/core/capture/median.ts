/** The middle of some numbers, the mean of the middle two of an even number; NaN of none. */
export function medianOf(numbers: ArrayLike<number>): number {
  const sorted = Float64Array.from(numbers).sort()
  const middle = sorted.length >> 1
  const upper = sorted[middle] ?? NaN
  return sorted.length % 2 === 1 ? upper : ((sorted[middle - 1] ?? NaN) + upper) / 2
}

/** Standard deviation of a sample, with n − 1; 0 for fewer than two. */
export function deviationOf(numbers: readonly number[]): number {
  if (numbers.length < 2) return 0
  const mean = numbers.reduce((sum, value) => sum + value, 0) / numbers.length
  const square = numbers.reduce((sum, value) => sum + (value - mean) ** 2, 0)
  return Math.sqrt(square / (numbers.length - 1))
}
