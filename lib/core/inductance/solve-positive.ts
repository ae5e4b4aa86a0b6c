/**
 * Solves A x = b for a symmetric positive definite matrix by Cholesky’s factors; NaN where it is not one. Reads the
 * lower half of the matrix only.
 */
export function solvePositive(matrix: readonly Float64Array[], right: Float64Array): Float64Array {
  const factor = matrix.map((row) => row.slice())
  for (const [i, row] of factor.entries()) {
    for (let j = 0; j <= i; j += 1) {
      const other = factor[j] ?? row
      const sum = (row[j] ?? 0) - product(row, other, j)
      row[j] = i === j ? Math.sqrt(sum) : sum / (other[j] ?? 1)
    }
  }
  const x = right.slice()
  for (const [i, row] of factor.entries()) {
    x[i] = ((x[i] ?? 0) - product(row, x, i)) / (row[i] ?? 1)
  }
  for (let i = factor.length - 1; i >= 0; i -= 1) {
    let sum = x[i] ?? 0
    for (let k = i + 1; k < factor.length; k += 1) sum -= (factor[k]?.[i] ?? 0) * (x[k] ?? 0)
    x[i] = sum / (factor[i]?.[i] ?? 1)
  }
  return x
}

/** Scalar product of the first entries of two rows; both are long enough. */
function product(a: Float64Array, b: Float64Array, count: number): number {
  let sum = 0
  for (let k = 0; k < count; k += 1) sum += (a[k] as number) * (b[k] as number)
  return sum
}
