import { ascii } from './ascii'

const nul = 0
const quote = 34

/** Decoded without its mark of byte order, whichever of the two it has. */
const utf16 = [
  { first: 0xff, second: 0xfe, encoding: 'utf-16le' },
  { first: 0xfe, second: 0xff, encoding: 'utf-16be' },
] as const

/**
 * The bytes of a file as plain lines: UTF-16 with a byte order mark as UTF-8, without the NULs that pad its end, with line
 * feeds where only carriage returns end the lines, and with numbers out of their quotes. Rows keep their numbers. A file
 * that needs none of it comes back as it is.
 */
export function plainText(bytes: Uint8Array): Uint8Array {
  return withoutQuotes(withLineFeeds(withoutPadding(asUtf8(bytes))))
}

function asUtf8(bytes: Uint8Array): Uint8Array {
  const found = utf16.find(({ first, second }) => bytes[0] === first && bytes[1] === second)
  return found === undefined ? bytes : new TextEncoder().encode(new TextDecoder(found.encoding).decode(bytes))
}

function withoutPadding(bytes: Uint8Array): Uint8Array {
  let end = bytes.length
  while (end > 0 && bytes[end - 1] === nul) end -= 1
  return bytes.subarray(0, end)
}

function withLineFeeds(bytes: Uint8Array): Uint8Array {
  const hasOnlyReturns = bytes.indexOf(ascii.lineFeed) < 0 && bytes.indexOf(ascii.carriageReturn) >= 0
  return hasOnlyReturns ? bytes.map((byte) => (byte === ascii.carriageReturn ? ascii.lineFeed : byte)) : bytes
}

/** Quotes become spaces; what separates columns is a decimal point within a quoted number, and a space within a title. */
function withoutQuotes(bytes: Uint8Array): Uint8Array {
  let start = bytes.indexOf(quote)
  if (start < 0) return bytes
  const plain = bytes.slice()
  while (start >= 0) {
    const end = bytes.indexOf(quote, start + 1)
    if (end < 0) break
    const mark = isNumber(bytes, start + 1, end) ? ascii.point : ascii.space
    if (mark === ascii.point) plain[start] = plain[end] = ascii.space
    for (let index = start + 1; index < end; index += 1) {
      if (isSeparator(bytes[index])) plain[index] = mark
    }
    start = bytes.indexOf(quote, end + 1)
  }
  return plain
}

const isSeparator = (byte: number | undefined): boolean =>
  byte === ascii.comma || byte === ascii.semicolon || byte === ascii.tab

function isNumber(bytes: Uint8Array, start: number, end: number): boolean {
  let digits = 0
  for (let index = start; index < end; index += 1) {
    const byte = bytes[index] ?? 0
    if (byte >= ascii.zero && byte <= ascii.nine) digits += 1
    else if (!numberMarks.has(byte)) return false
  }
  return digits > 0
}

const numberMarks = new Set<number>([
  ascii.plus,
  ascii.minus,
  ascii.point,
  ascii.comma,
  ascii.space,
  ascii.lowerE,
  ascii.upperE,
])
