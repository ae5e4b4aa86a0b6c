import type { HeadingEntry } from './heading'
import { NumberScanner } from './number-scanner'
import { unitOf, withoutPrefix, type WrittenUnit } from './unit-text'

/** A number with its unit, as the value of a heading line. */
type Reading = { readonly value: number; readonly written: WrittenUnit | null }

const intervalKeys =
  /^(sample |sampling |time |x )?(interval|increment|step|period|resolution)$|^dt$|^delta t$/u
const rateKeys = /^(sample |sampling )(rate|frequency)$|^fs$/u
const startKeys = /^(start|start time|first sample|time of first sample|t0|x origin)$/u

/** The interval that a heading line states, and that line; null where none does. */
export function statedInterval(entries: readonly HeadingEntry[]): { seconds: number; line: string } | null {
  for (const { key, value, line } of entries) {
    const name = bareKey(key)
    const reading = readingOf(value, key)
    if (reading === null || !(reading.value > 0)) continue
    if (intervalKeys.test(name) && isOf(reading, 's')) return { seconds: reading.value, line }
    if (rateKeys.test(name) && isOf(reading, 'Hz')) return { seconds: 1 / reading.value, line }
  }
  return null
}

/** The time of the first sample that a heading line states, else 0. */
export function statedStart(entries: readonly HeadingEntry[]): number {
  const entry = entries.find(({ key }) => startKeys.test(bareKey(key)))
  const reading = entry === undefined ? null : readingOf(entry.value, entry.key)
  return reading !== null && isOf(reading, 's') ? reading.value : 0
}

const isOf = (reading: Reading, unit: WrittenUnit['unit']): boolean =>
  reading.written === null || reading.written.unit === unit

const bareKey = (key: string): string =>
  key
    .replace(/\s*[[(].*$/u, '')
    .replaceAll('_', ' ')
    .trim()

const encoder = new TextEncoder()

/** Reads "1.000E-09 s"; a unit may also stand in the key: "interval (ns)". */
function readingOf(value: string, key: string): Reading | null {
  const bytes = encoder.encode(value)
  const scanner = new NumberScanner(bytes, 0)
  const number = scanner.read(0)
  if (!Number.isFinite(number)) return null
  const after = value
    .slice(scanner.end)
    .replace(/^[\s,;\t]+/u, '')
    .replace(/\/s$/u, '')
  const inKey = /[[(]([^\])]*)[\])]/u.exec(key)?.[1] ?? ''
  const written = unitOf(after) ?? unitOf(inKey)
  return { value: withoutPrefix(number, written?.exponent ?? 0), written }
}
