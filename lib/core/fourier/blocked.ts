import { nearSquareFactors } from './radices'
import { planStockham, runStockham, type StockhamPlan } from './stockham'
import { rootsOfUnity } from './twiddles'

/** Series that are transformed side by side: 16 complex values fill four cache lines. */
const blockWidth = 8

/** Keeps the rows of the table from falling on the same cache sets, in complex values. */
const rowPadding = 4

/** A long length as a table of rows × columns, so that every short transform stays in the cache. */
export type BlockedPlan = {
  readonly length: number
  readonly rows: StockhamPlan
  readonly columns: StockhamPlan
  /** exp(−j 2π k/n) for k below `fineCount`, and for multiples of it. */
  readonly fine: Float64Array
  readonly coarse: Float64Array
  readonly fineBits: number
  readonly table: Float64Array
  readonly x: Float64Array
  readonly y: Float64Array
}

/** Null where the length has a prime factor above 5 or no two factors. */
export function planBlocked(length: number): BlockedPlan | null {
  const [rowCount, columnCount] = nearSquareFactors(length)
  const rows = planStockham(rowCount)
  const columns = planStockham(columnCount)
  if (rows === null || columns === null || rowCount === 1) return null
  const fineBits = Math.ceil(Math.log2(length) / 2)
  const fineCount = 2 ** fineBits
  const block = 2 * blockWidth * Math.max(rowCount, columnCount)
  return {
    length,
    rows,
    columns,
    fine: rootsOfUnity(fineCount, length),
    coarse: rootsOfUnity(Math.floor(length / fineCount) + 1, length, fineCount),
    fineBits,
    table: new Float64Array(2 * rowCount * (columnCount + rowPadding)),
    x: new Float64Array(block),
    y: new Float64Array(block),
  }
}

/**
 * Forward transform of interleaved complex values by the four-step method: transforms down the columns, twiddle factors,
 * transforms along the rows, read out by columns. Two walks through memory, whatever the length.
 *
 * Source: D. H. Bailey, "FFTs in external or hierarchical memory", J. Supercomputing 4, 1990, 23-35 (from memory).
 */
export function runBlocked(plan: BlockedPlan, values: Float64Array, out: Float64Array): void {
  const columnCount = plan.columns.length
  for (let column = 0; column < columnCount; column += blockWidth) {
    transformColumns(plan, values, column, Math.min(blockWidth, columnCount - column))
  }
  const rowCount = plan.rows.length
  for (let row = 0; row < rowCount; row += blockWidth) {
    transformRows(plan, out, row, Math.min(blockWidth, rowCount - row))
  }
}

function transformColumns(plan: BlockedPlan, values: Float64Array, column: number, count: number): void {
  const { table, x, y } = plan
  const rowCount = plan.rows.length
  const pitch = 2 * plan.columns.length
  const width = 2 * count
  for (let row = 0, to = 0; row < rowCount; row += 1) {
    const from = row * pitch + 2 * column
    for (let index = 0; index < width; index += 1, to += 1) x[to] = values[from + index] ?? 0
  }
  const done = runStockham(plan.rows, x, y, count)
  const tablePitch = pitch + 2 * rowPadding
  for (let row = 0; row < rowCount; row += 1) {
    writeTurned(plan, done, row, column, count, table, row * tablePitch + 2 * column)
  }
}

/** Multiplies a piece of a row by exp(−j 2π row·column/n), put together from two small tables of roots. */
function writeTurned(
  { fine, coarse, fineBits }: BlockedPlan,
  values: Float64Array,
  row: number,
  column: number,
  count: number,
  out: Float64Array,
  at: number,
): void {
  const mask = 2 ** fineBits - 1
  let turn = row * column
  let from = 2 * row * count
  const end = at + 2 * count
  for (let to = at; to < end; to += 2, from += 2, turn += row) {
    const low = 2 * (turn & mask)
    const high = 2 * (turn >> fineBits)
    const lowR = fine[low] ?? 0
    const lowI = fine[low + 1] ?? 0
    const highR = coarse[high] ?? 0
    const highI = coarse[high + 1] ?? 0
    const wr = lowR * highR - lowI * highI
    const wi = lowR * highI + lowI * highR
    const real = values[from] ?? 0
    const imaginary = values[from + 1] ?? 0
    out[to] = wr * real - wi * imaginary
    out[to + 1] = wr * imaginary + wi * real
  }
}

function transformRows(plan: BlockedPlan, out: Float64Array, row: number, count: number): void {
  const { table, x, y } = plan
  const columnCount = plan.columns.length
  const rowCount = plan.rows.length
  const tablePitch = 2 * (columnCount + rowPadding)
  const width = 2 * count
  for (let index = 0; index < count; index += 1) {
    const from = (row + index) * tablePitch
    for (let column = 0, to = 2 * index; column < columnCount; column += 1, to += width) {
      x[to] = table[from + 2 * column] ?? 0
      x[to + 1] = table[from + 2 * column + 1] ?? 0
    }
  }
  const done = runStockham(plan.columns, x, y, count)
  for (let k = 0, from = 0; k < columnCount; k += 1) {
    const to = 2 * (row + k * rowCount)
    for (let index = 0; index < width; index += 1, from += 1) out[to + index] = done[from] ?? 0
  }
}
