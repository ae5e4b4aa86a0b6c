import { ascii } from './ascii'
import { NumberScanner } from './number-scanner'
import { overRangeAt } from './over-range'
import { firstLines, type Line } from './text-lines'

/** How the numbers of a file are laid out. */
export type Layout = {
  readonly separator: number
  readonly columns: number
  /** The lines before the numbers. */
  readonly heading: readonly Line[]
  /** The first byte of the first row of numbers. */
  readonly dataStart: number
}

/** How many lines may come before the numbers. */
export const mostHeadingLines = 500

/** More columns than an export of an instrument has; a line of more is not taken for a row. */
export const mostColumns = 256

/** So many rows of numbers in a row are the data; fewer may be values among the lines before it. */
const rowsThatTell = 3

/** Spaces come last: they also stand beside the others. */
const separators = [ascii.tab, ascii.semicolon, ascii.comma, ascii.space] as const

/** The separator under which the most columns of numbers are found, and where they begin; null where there are none. */
export function findLayout(bytes: Uint8Array): Layout | null {
  const lines = firstLines(bytes, mostHeadingLines + rowsThatTell)
  let best: Layout | null = null
  for (const separator of separators) {
    const found = layoutWith(separator, bytes, lines)
    if (found !== null && (best === null || found.columns > best.columns)) best = found
  }
  return best
}

function layoutWith(separator: number, bytes: Uint8Array, lines: readonly Line[]): Layout | null {
  const counts = lines.map((line) => numbersIn(bytes, line, separator))
  const first = counts.findIndex((columns, index) => columns > 0 && goesOn(counts, index))
  const line = lines[first]
  const columns = counts[first]
  if (line === undefined || columns === undefined) return null
  return { separator, columns, heading: lines.slice(0, first), dataStart: line.start }
}

const blank = -1

function goesOn(counts: readonly number[], index: number): boolean {
  const following = counts.slice(index, index + rowsThatTell)
  return following.every((columns) => columns === counts[index] || columns === blank)
}

/** How many numbers a line consists of: 0 where anything else is in it, −1 where nothing is in it. */
function numbersIn(bytes: Uint8Array, line: Line, separator: number): number {
  const scanner = new NumberScanner(bytes, separator === ascii.comma ? ascii.point : 0)
  let position = skipSpaces(bytes, line.start, line.end)
  if (position === line.end) return blank
  for (let columns = 1; columns <= mostColumns; columns += 1) {
    const end = Number.isNaN(scanner.read(position)) ? overRangeAt(bytes, position)?.end : scanner.end
    if (end === undefined) return 0
    position = skipSpaces(bytes, end, line.end)
    if (position >= line.end) return columns
    if (separator === ascii.space) {
      if (position === end) return 0
      continue
    }
    if (bytes[position] !== separator) return 0
    position = skipSpaces(bytes, position + 1, line.end)
    // A separator at the end of every row, as some exports have it, begins no column.
    if (position >= line.end) return columns
  }
  return 0
}

function skipSpaces(bytes: Uint8Array, start: number, end: number): number {
  let position = start
  while (position < end && bytes[position] === ascii.space) position += 1
  return position
}
