import { err, ok, type Result } from '../result'

import type { Capture, CaptureError } from './capture'
import { channelsOf } from './channels'
import { readHeading } from './heading'
import { findLayout, mostHeadingLines } from './layout'
import { readColumns } from './read-columns'
import { placeSamples } from './sample-times'
import { looksBinary, textStart } from './text-lines'

/**
 * Reads a capture from delimited text: UTF-8 or Latin-1; comma, semicolon or tab between columns; a decimal comma
 * where the separator is not the comma; entries, titles and units before the numbers; a time column, or a line that
 * states the interval. Values come out in SI units. Every number equals what `Number` makes of its text.
 * Errors name the row and column, counted from 1, and say what to do; `1e`, `1e400` and empty cells are refused.
 */
export function parseCapture(bytes: Uint8Array): Result<Capture, CaptureError> {
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
      ...channels
        .filter(({ unit }) => unit === '')
        .map(({ name }) => `No unit is given for “${name}”; its values are taken as they are written.`),
    ],
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
