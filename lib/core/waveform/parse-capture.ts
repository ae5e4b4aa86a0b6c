import { err, ok, type Result } from '../result'

import type { Capture, CaptureChannel, CaptureError } from './capture'
import { channelsOf } from './channels'
import { readHeading } from './heading'
import { findLayout, mostHeadingLines } from './layout'
import { plainText } from './plain-text'
import { readColumns, type Columns } from './read-columns'
import { placeSamples, type MeasuredColumn } from './sample-times'
import { looksBinary, textStart } from './text-lines'

/**
 * Reads a capture from delimited text: UTF-8, Latin-1 or UTF-16 with a byte order mark; comma, semicolon, tab or spaces
 * between columns; a decimal comma where the separator is not the comma or the number is quoted; entries, titles and units
 * before the numbers; a time column, or a line that states the interval. Samples written as `inf` or `∞` hold the extreme
 * of the rest and are warned of. Values come out in SI units. Every number equals what `Number` makes of its text.
 * Errors name the row and column, counted from 1, and say what to do; `1e`, `1e400` and empty cells are refused.
 */
export function parseCapture(file: Uint8Array): Result<Capture, CaptureError> {
  const bytes = plainText(file)
  if (bytes.length <= textStart(bytes)) return err(empty)
  if (looksBinary(bytes)) return err(notText)
  const layout = findLayout(bytes)
  if (layout === null) return err(noNumbers)
  const read = readColumns(bytes, layout)
  if (!read.ok) return read
  const heading = readHeading(bytes, layout)
  const placed = placeSamples(read.value, heading, layout.heading.length + 1)
  if (!placed.ok) return placed
  const { times, measured } = placed.value
  const channels = channelsOf(measured, heading)
  return ok({
    startSeconds: times.startSeconds,
    intervalSeconds: times.intervalSeconds,
    intervalSource: times.intervalSource,
    samples: read.value.rows,
    channels,
    warnings: [
      ...times.warnings,
      ...overRangeWarnings(read.value, measured, channels),
      ...channels
        .filter(({ unit }) => unit === '')
        .map(({ name }) => `No unit is given for “${name}”; its values are taken as they are written.`),
    ],
  })
}

function overRangeWarnings(
  { columns, overRange }: Columns,
  measured: readonly MeasuredColumn[],
  channels: readonly CaptureChannel[],
): readonly string[] {
  return measured.flatMap((column, index) => {
    const beyond = overRange[columns.indexOf(column.values)] ?? 0
    const name = channels[index]?.name ?? ''
    return beyond === 0
      ? []
      : [
          `${beyond} samples of “${name}” lie beyond the range of the instrument; they are taken as its extreme.`,
        ]
  })
}

const empty: CaptureError = {
  code: 'empty',
  message: 'The file is empty; export the capture again and send the new file.',
}

const notText: CaptureError = {
  code: 'not_text',
  message: 'The file is not plain text; export the capture as delimited text in UTF-8 (CSV) and send that.',
}

const noNumbers: CaptureError = {
  code: 'no_numbers',
  message: `No rows of numbers begin within the first ${mostHeadingLines} rows; export the samples as columns separated by commas, semicolons or tabs.`,
}
