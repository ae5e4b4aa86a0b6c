import { err, ok, type Result } from '../result'

import type { CaptureError } from './capture'
import type { ColumnTitle } from './column-title'
import type { Heading } from './heading'
import { statedInterval, statedStart } from './heading-interval'
import type { Columns } from './read-columns'
import { timeBaseOf } from './time-column'
import { withoutPrefix } from './unit-text'

export type SampleTimes = {
  readonly startSeconds: number
  readonly intervalSeconds: number
  readonly intervalSource: string
  readonly warnings: readonly string[]
}

export type MeasuredColumn = { readonly values: Float64Array; readonly title: ColumnTitle | undefined }

type Placed = { readonly times: SampleTimes; readonly measured: readonly MeasuredColumn[] }

/** Tells the time column from the measured ones and finds when each sample was taken. */
export function placeSamples(
  read: Columns,
  heading: Heading,
  firstRow: number,
): Result<Placed, CaptureError> {
  const all = read.columns.map((values, index) => ({ values, title: heading.titles[index] }))
  const [first, ...others] = all
  const stated = statedInterval(heading.entries)
  if (first === undefined || others.length === 0) return fromHeading(all, heading, stated)
  if (indexName.test(first.title?.name ?? '') && stated !== null) return fromHeading(others, heading, stated)
  if (!isTime(first, stated !== null)) return fromHeading(all, heading, stated)
  const found = timeBaseOf(first.values, firstRow)
  if (!found.ok) return found
  const { start, interval, rounded } = found.value
  const unit = first.title?.unit
  return ok({
    measured: others,
    times: {
      startSeconds: withoutPrefix(start, unit?.exponent ?? 0),
      intervalSeconds: withoutPrefix(interval, unit?.exponent ?? 0),
      intervalSource: rounded
        ? `The interval is the span of the time column divided by ${read.rows - 1}, because its stamps are rounded and repeat.`
        : `The interval is the span of the time column divided by ${read.rows - 1}.`,
      warnings: unit?.unit === 's' ? [] : ['No unit is given for the time column; seconds are assumed.'],
    },
  })
}

const timeName = /^(t|x|time|zeit|temps|tempo|tiempo)(\W|_|$)/iu
const indexName = /^(n|no|index|point|points|sample|samples)\.?$/iu

/** A column of seconds or one called time; without a title, the first of several if it only rises. */
function isTime({ values, title }: MeasuredColumn, intervalIsStated: boolean): boolean {
  if (title?.unit !== undefined && title.unit !== null) return title.unit.unit === 's'
  if (timeName.test(title?.name ?? '')) return true
  return !intervalIsStated && values.every((value, index) => index === 0 || value >= (values[index - 1] ?? 0))
}

function fromHeading(
  measured: readonly MeasuredColumn[],
  heading: Heading,
  stated: { readonly seconds: number; readonly line: string } | null,
): Result<Placed, CaptureError> {
  if (stated === null) return err(noInterval)
  return ok({
    measured,
    times: {
      startSeconds: statedStart(heading.entries),
      intervalSeconds: stated.seconds,
      intervalSource: `The interval is the one stated in the line “${stated.line}” of the file.`,
      warnings: countWarnings(heading, measured[0]?.values.length ?? 0),
    },
  })
}

const countKeys = /^(samples|record length|number of samples|points)$/u

function countWarnings(heading: Heading, rows: number): readonly string[] {
  const stated = heading.entries.find(({ key }) => countKeys.test(key))
  if (stated === undefined || !(Number(stated.value) > 0) || Number(stated.value) === rows) return []
  return [`The file states ${stated.value} samples but holds ${rows}; it may have been cut off.`]
}

const noInterval: CaptureError = {
  code: 'no_interval',
  message:
    'The file has no time column and no line that states the sample interval; add a time column, or a first line such as “sample interval: 1e-9 s”.',
}
