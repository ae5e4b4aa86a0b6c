import type { CaptureChannel } from './capture'
import type { Heading } from './heading'
import type { MeasuredColumn } from './sample-times'
import { unitOf, withoutPrefix, type WrittenUnit } from './unit-text'

/** The measured columns with their names, in SI units. */
export function channelsOf(measured: readonly MeasuredColumn[], heading: Heading): readonly CaptureChannel[] {
  const stated = (key: string) => heading.entries.find((entry) => entry.key === key)?.value
  const commonUnit = unitOf(stated('unit') ?? '')
  const onlyName = measured.length === 1 ? stated('channel') : undefined
  return measured.map(({ values, title }, index) => {
    const written = title?.unit ?? commonUnit
    const name = onlyName || title?.name || `Channel ${index + 1}`
    return { name, unit: electrical(written), values: scaled(values, written?.exponent ?? 0) }
  })
}

function electrical(written: WrittenUnit | null): CaptureChannel['unit'] {
  return written?.unit === 'V' || written?.unit === 'A' ? written.unit : ''
}

const scaled = (values: Float64Array, exponent: number): Float64Array =>
  exponent === 0 ? values : values.map((value) => withoutPrefix(value, exponent))
