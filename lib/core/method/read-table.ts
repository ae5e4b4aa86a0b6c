import { err, ok, type Result } from '../result'
import { parseQuantity } from '../units/parse-quantity'
import { boundProblem } from './bound-problem'
import type { ColumnInput, PlainRow, RawInput, TableInput } from './input-definition'

type RawRow = readonly (number | string)[] | Readonly<Record<string, number | string>>

/**
 * Reads rows of values: text with a row a line, arrays in the order of the columns, or objects keyed by column. Cells
 * are separated by tabs, semicolons, commas, or spaces; decimal commas need tabs or semicolons. Empty lines are left
 * out. The first row that cannot be read is named with its number, counted from 1, and its column.
 */
export function readTable(definition: TableInput, given: RawInput): Result<readonly PlainRow[], string> {
  if (typeof given === 'number') return err(`${definition.label} takes ${columnList(definition)} a row.`)
  const raw: readonly RawRow[] = typeof given === 'string' ? rowsOfText(definition, given) : given
  const { leastRows, mostRows, label } = definition
  if (raw.length < leastRows) return err(`${label}: at least ${leastRows} rows are needed, a line each.`)
  if (raw.length > mostRows) return err(`${label}: at most ${mostRows} rows can be taken.`)
  const rows: PlainRow[] = []
  for (const [index, row] of raw.entries()) {
    const read = readRow(definition, row)
    if (!read.ok) return err(`${label}, row ${index + 1}: ${read.error}`)
    rows.push(read.value)
  }
  return ok(rows)
}

function rowsOfText(definition: TableInput, text: string): string[][] {
  const most = Object.keys(definition.columns).length
  const lines = text.split(/\r\n|\r|\n/u).filter((line) => line.trim() !== '')
  return lines.map((line) => cellsOf(line.trim(), most))
}

/** Splits at the strongest separator that the line holds; spaces separate only where they give every column a cell. */
function cellsOf(line: string, columns: number): string[] {
  for (const separator of ['\t', ';', ',']) {
    if (line.includes(separator)) return line.split(separator).map((cell) => cell.trim())
  }
  const words = line.split(/\s+/u)
  return words.length === columns ? words : [line]
}

function readRow(definition: TableInput, row: RawRow): Result<PlainRow, string> {
  const columns = Object.entries(definition.columns)
  const isList = Array.isArray(row)
  const given: Readonly<Record<string, number | string>> = isList
    ? Object.fromEntries(
        columns.flatMap(([key], index) => (index < row.length ? [[key, row[index] ?? '']] : [])),
      )
    : (row as Readonly<Record<string, number | string>>)
  if (isList && row.length > columns.length) {
    return err(`${columnList(definition)} are wanted; there are ${row.length} cells.`)
  }
  const unknown = Object.keys(given).find((key) => !Object.hasOwn(definition.columns, key))
  if (unknown !== undefined) return err(`there is no column “${unknown}”.`)
  const cells: [string, number | string][] = []
  for (const [key, column] of columns) {
    const read = readCell(column, Object.hasOwn(given, key) ? given[key] : undefined)
    if (!read.ok) return err(read.error)
    cells.push([key, read.value])
  }
  return ok(Object.fromEntries(cells))
}

function readCell(column: ColumnInput, given: number | string | undefined): Result<number | string, string> {
  if (given === undefined || given === '') {
    return column.fallback === undefined ? err(`${column.label} is missing.`) : ok(column.fallback)
  }
  const { unit } = column
  if (unit === 'text') return ok(String(given))
  const parsed = typeof given === 'number' ? ok(given) : parseQuantity(given, unit)
  if (!parsed.ok) return err(parsed.error.message)
  const problem = boundProblem({ ...column, unit }, parsed.value)
  return problem === null ? ok(parsed.value + 0) : err(problem)
}

/** "2 cells (x, y)". */
function columnList({ columns }: TableInput): string {
  const labels = Object.values(columns).map(({ label }) => label)
  return `${labels.length} cells (${labels.join(', ')})`
}
