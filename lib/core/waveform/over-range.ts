import { ascii } from './ascii'
import { textOf } from './text-lines'

/** What an instrument writes where a sample lies beyond its range. */
const written = /^(?:inf(?:inity)?|∞)(?![\p{L}\p{N}])/iu

/** The longest of these, in bytes. */
const longest = 9

/** A sample written as beyond the range: which way, and where its text ends; null where something else stands there. */
export function overRangeAt(
  bytes: Uint8Array,
  start: number,
): { readonly value: number; readonly end: number } | null {
  const sign = bytes[start]
  const from = sign === ascii.minus || sign === ascii.plus ? start + 1 : start
  const [found] = written.exec(textOf(bytes, from, Math.min(bytes.length, from + longest))) ?? []
  if (found === undefined) return null
  return {
    value: sign === ascii.minus ? -Infinity : Infinity,
    end: from + new TextEncoder().encode(found).length,
  }
}

/**
 * Puts the extremes of a column in place of samples beyond the range, which is the least that they can be; returns how many
 * there were. Null where no sample of the column is within the range.
 */
export function boundOverRange(values: Float64Array): number | null {
  let high = -Infinity
  let low = Infinity
  let beyond = 0
  for (let index = 0; index < values.length; index += 1) {
    const value = values[index] ?? 0
    if (value === Infinity || value === -Infinity) beyond += 1
    else {
      if (value > high) high = value
      if (value < low) low = value
    }
  }
  if (beyond === 0) return 0
  if (low > high) return null
  values.forEach((value, index) => {
    if (value === Infinity) values[index] = high
    else if (value === -Infinity) values[index] = low
  })
  return beyond
}
