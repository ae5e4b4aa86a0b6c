import { titleOf, unitCell, unquoted, type ColumnTitle } from './column-title'
import type { Layout } from './layout'
import { textOf } from './text-lines'

/** A line "key: value" before the numbers, with the line as it is written. */
export type HeadingEntry = { readonly key: string; readonly value: string; readonly line: string }

/** What the lines before the numbers say. */
export type Heading = {
  /** One for each column, or none where the file has no row of titles. */
  readonly titles: readonly ColumnTitle[]
  readonly entries: readonly HeadingEntry[]
}

/** Reads the lines before the numbers: entries, then a row of titles, then perhaps a row of units. */
export function readHeading(bytes: Uint8Array, layout: Layout): Heading {
  const separator = String.fromCharCode(layout.separator)
  const lines = layout.heading
    .map((line) =>
      textOf(bytes, line.start, line.end)
        .replace(/^\s*[#;%]+\s*/u, '')
        .trim(),
    )
    .filter((line) => line !== '')
  const rows = lines.map((line) => cellsOf(line, separator, layout.columns))
  const units = unitsIn(rows.at(-1))
  const titleRow = rows.at(units === null ? -1 : -2)
  const titles = titleRow !== undefined && areTitles(titleRow) ? titleRow.map(titleOf) : []
  const used = (units === null ? 0 : 1) + (titles.length === 0 ? 0 : 1)
  return {
    titles:
      units === null ? titles : units.map((unit, column) => ({ name: titles[column]?.name ?? '', unit })),
    entries: lines.slice(0, lines.length - used).flatMap((line) => entryOf(line, separator)),
  }
}

/** The cells of a line if there are as many as columns; a separator at the end begins no cell. */
function cellsOf(line: string, separator: string, columns: number): readonly string[] | null {
  const ways = separator === ' ' ? [/\s{2,}/u, /\s+/u] : [separator]
  const fitting = ways.map((way) => cellsBy(line, way, columns)).find((cells) => cells.length === columns)
  return fitting ?? null
}

function cellsBy(line: string, separator: string | RegExp, columns: number): readonly string[] {
  const cells = line.split(separator).map(unquoted)
  if (cells.length === columns + 1 && cells.at(-1) === '') cells.pop()
  return cells
}

function unitsIn(row: readonly string[] | null | undefined) {
  if (row === null || row === undefined) return null
  const units = row.map(unitCell)
  return units.every((unit) => unit !== null) ? units : null
}

const areTitles = (row: readonly string[] | null): row is readonly string[] =>
  row !== null && row.every((cell) => Number.isNaN(Number(cell)) && !/[:=]/u.test(cell))

function entryOf(line: string, separator: string): readonly HeadingEntry[] {
  const at = [':', '=', separator].map((mark) => line.indexOf(mark)).filter((index) => index > 0)
  if (at.length === 0) return []
  const cut = Math.min(...at)
  const key = unquoted(line.slice(0, cut)).toLowerCase()
  return [{ key, value: unquoted(line.slice(cut + 1)), line }]
}
