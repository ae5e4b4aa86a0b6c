import { err, ok, type Result } from '../result'

import { ascii } from './ascii'
import type { CaptureError } from './capture'
import type { Layout } from './layout'
import { NumberScanner } from './number-scanner'
import { countLines, textOf } from './text-lines'

/** The numbers of a file, column by column, as they are written. */
export type Columns = { readonly rows: number; readonly columns: readonly Float64Array[] }

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
      const value = scanner.read(position)
      const end = skipSpaces(bytes, scanner.end)
      const last = column === columns.length - 1
      if (!Number.isFinite(value) || !endsWell(bytes, end, last, layout.separator)) {
        return err(faultAt(bytes, layout, scanner, { row: line, column: column + 1, position }))
      }
      const values = columns[column]
      if (values !== undefined) values[rows] = value
      position = last ? afterRow(bytes, end) : skipSpaces(bytes, end + 1)
    }
    rows += 1
  }
  return ok({ rows, columns: columns.map((values) => values.subarray(0, rows)) })
}

const isLineEnd = (byte: number | undefined): boolean =>
  byte === undefined || byte === ascii.lineFeed || byte === ascii.carriageReturn

function skipSpaces(bytes: Uint8Array, start: number): number {
  let position = start
  while (bytes[position] === ascii.space) position += 1
  return position
}

function endsWell(bytes: Uint8Array, end: number, last: boolean, separator: number): boolean {
  if (!last) return bytes[end] === separator
  if (isLineEnd(bytes[end])) return true
  return bytes[end] === separator && isLineEnd(bytes[skipSpaces(bytes, end + 1)])
}

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
  if (skipSpaces(bytes, scanner.end) < end || Number.isNaN(value)) {
    return of(
      `${place} holds “${cell}”, which is not a number as in the rows before it; correct it or cut the file off there.`,
    )
  }
  if (!Number.isFinite(value)) {
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
