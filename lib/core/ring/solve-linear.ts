/** The solution of a small system of linear equations by elimination with row pivoting; null where it is singular. */
export function solveLinear(
  matrix: readonly (readonly number[])[],
  right: readonly number[],
): readonly number[] | null {
  const rows = matrix.map((row, index) => [...row, right[index] ?? 0])
  const size = rows.length
  for (let column = 0; column < size; column += 1) {
    const pivot = pivotRow(rows, column)
    const top = rows[pivot]
    const head = top?.[column] ?? 0
    if (top === undefined || head === 0 || !Number.isFinite(head)) return null
    rows[pivot] = rows[column] ?? top
    rows[column] = top
    for (const [index, row] of rows.entries()) {
      if (index === column) continue
      const factor = (row[column] ?? 0) / head
      for (let entry = column; entry <= size; entry += 1)
        row[entry] = (row[entry] ?? 0) - factor * (top[entry] ?? 0)
    }
  }
  return rows.map((row, index) => (row[size] ?? 0) / (row[index] ?? 1))
}

function pivotRow(rows: readonly (readonly number[])[], column: number): number {
  let pivot = column
  for (let row = column + 1; row < rows.length; row += 1) {
    if (Math.abs(rows[row]?.[column] ?? 0) > Math.abs(rows[pivot]?.[column] ?? 0)) pivot = row
  }
  return pivot
}
