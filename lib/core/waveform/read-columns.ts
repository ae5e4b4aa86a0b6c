import { err, ok, type Result } from '../result'

import { ascii } from './ascii'
import type { CaptureError } from './capture'
import type { Layout } from './layout'
import { NumberScanner } from './number-scanner'
import { boundOverRange, overRangeAt } from './over-range'
import { countLines, textOf } from './text-lines'

/** The numbers of a file, column by column, as they are written. */
export type Columns = {
  readonly rows: number
  readonly columns: readonly Float64Array[]
  /** How many samples of each column are written as beyond the range; they hold the extreme of the rest. */
  readonly overRange: readonly number[]
}

type Fault = { readonly row: number; readonly column: number; readonly position: number }

/** Reads every row after the heading; the first cell that is no number ends it with that cell's place. */
export function readColumns(bytes: Uint8Array, layout: Layout): Result<Columns, CaptureError> {
  // A row takes at least two bytes for each column, so that blank lines cannot ask for memory.
  const bound = Math.ceil((bytes.length - layout.dataStart + 1) / (2 * layout.columns))
  const capacity = Math.min(bound, countLines(bytes, layout.dataStart))
  const columns = Array.from({ length: layout.columns }, () => new Float64Array(capacity))
  const scanner = new NumberScanner(bytes, layout.separator === ascii.comma ? ascii.point : 0)
  let position = layout.dataStart
  let rows = 0
  for (let line = layout.heading.length + 1; position < bytes.length; line += 1) {
    position = skipSpaces(bytes, position)
    if (isLineEnd(bytes[position])) {
      position = afterLine(bytes, position)
      continue
    }
    for (let column = 0; column < columns.length; column += 1) {
      const read = scanner.read(position)
      const beyond = Number.isNaN(read) ? overRangeAt(bytes, position) : null
      const cellEnd = beyond?.end ?? scanner.end
      const end = skipSpaces(bytes, cellEnd)
      const last = column === columns.length - 1
      const isNumber = beyond !== null || Number.isFinite(read)
      if (!isNumber || !(last ? endsRow(bytes, end, layout) : endsCell(bytes, cellEnd, end, layout))) {
        return err(faultAt(bytes, layout, scanner, { row: line, column: column + 1, position }))
      }
      const values = columns[column]
      if (values !== undefined) values[rows] = beyond?.value ?? read
      position = last ? afterRow(bytes, end) : nextCell(bytes, end, layout)
    }
    rows += 1
  }
  return bounded(
    columns.map((values) => values.subarray(0, rows)),
    layout,
  )
}

function bounded(columns: readonly Float64Array[], layout: Layout): Result<Columns, CaptureError> {
  const overRange: number[] = []
  for (const [index, values] of columns.entries()) {
    const beyond = boundOverRange(values)
    if (beyond === null) return err(allBeyond(layout.heading.length + 1, index + 1))
    overRange.push(beyond)
  }
  return ok({ rows: columns[0]?.length ?? 0, columns, overRange })
}

const allBeyond = (row: number, column: number): CaptureError => ({
  code: 'bad_number',
  message: `Column ${column} holds nothing within the range of the instrument, from row ${row} on; take it out, or measure again with a wider range.`,
  row,
  column,
})

const isLineEnd = (byte: number | undefined): boolean =>
  byte === undefined || byte === ascii.lineFeed || byte === ascii.carriageReturn

function skipSpaces(bytes: Uint8Array, start: number): number {
  let position = start
  while (bytes[position] === ascii.space) position += 1
  return position
}

/** Between two cells: the separator, or the spaces themselves. */
const endsCell = (bytes: Uint8Array, cellEnd: number, end: number, { separator }: Layout): boolean =>
  separator === ascii.space ? end > cellEnd && !isLineEnd(bytes[end]) : bytes[end] === separator

const nextCell = (bytes: Uint8Array, end: number, { separator }: Layout): number =>
  separator === ascii.space ? end : skipSpaces(bytes, end + 1)

const endsRow = (bytes: Uint8Array, end: number, { separator }: Layout): boolean =>
  isLineEnd(bytes[end]) || (bytes[end] === separator && isLineEnd(bytes[skipSpaces(bytes, end + 1)]))

const afterRow = (bytes: Uint8Array, end: number): number => {
  if (bytes[end] === ascii.lineFeed) return end + 1
  return afterLine(bytes, end)
}

function afterLine(bytes: Uint8Array, start: number): number {
  const found = bytes.indexOf(ascii.lineFeed, start)
  return found < 0 ? bytes.length : found + 1
}

const quotedLength = 24

function faultAt(bytes: Uint8Array, layout: Layout, scanner: NumberScanner, fault: Fault): CaptureError {
  const { row, column, position } = fault
  const place = `Row ${row}, column ${column}`
  const end = cellEnd(bytes, position, layout.separator)
  const cell = textOf(bytes, position, Math.min(end, position + quotedLength)).replace(
    /[^\p{L}\p{N}\p{P}\p{S} ]/gu,
    '?',
  )
  const of = (what: string): CaptureError => ({ code: 'bad_number', message: what, row, column })
  if (end === position) {
    return of(`${place} is empty; fill the cell in or take the row out, then send the file again.`)
  }
  const value = scanner.read(position)
  const isBeyond = Number.isNaN(value) && overRangeAt(bytes, position)?.end === end
  if (!isBeyond && (skipSpaces(bytes, scanner.end) < end || Number.isNaN(value))) {
    return of(
      `${place} holds “${cell}”, which is not a number as in the rows before it; correct it or cut the file off there.`,
    )
  }
  if (!isBeyond && !Number.isFinite(value)) {
    return of(`${place} holds “${cell}”, which is too large for a number; correct it or take the row out.`)
  }
  return of(
    `Row ${row} does not have the ${layout.columns} columns of the rows before it; correct it or take it out.`,
  )
}

function cellEnd(bytes: Uint8Array, start: number, separator: number): number {
  let end = start
  while (end < bytes.length && bytes[end] !== separator && !isLineEnd(bytes[end])) end += 1
  return end
}
