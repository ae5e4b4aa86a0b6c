import { ascii } from './ascii'

/** Where a line lies in the bytes: [start, end), without its line end. */
export type Line = { readonly start: number; readonly end: number }

/** The position after a byte order mark of UTF-8, if there is one. */
export const textStart = (bytes: Uint8Array): number =>
  bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf ? 3 : 0

/** The lines from the start of the text on, at most `most`; each ends at a line feed, with or without a carriage return. */
export function firstLines(bytes: Uint8Array, most: number): readonly Line[] {
  const lines: Line[] = []
  let start = textStart(bytes)
  while (start < bytes.length && lines.length < most) {
    const found = bytes.indexOf(ascii.lineFeed, start)
    const next = found < 0 ? bytes.length : found
    const end = next > start && bytes[next - 1] === ascii.carriageReturn ? next - 1 : next
    lines.push({ start, end })
    start = next + 1
  }
  return lines
}

/** How many lines there are from `start` on. */
export function countLines(bytes: Uint8Array, start: number): number {
  let lines = 1
  let position = bytes.indexOf(ascii.lineFeed, start)
  while (position >= 0) {
    lines += 1
    position = bytes.indexOf(ascii.lineFeed, position + 1)
  }
  return lines
}

/** Text of a part: UTF-8, or Latin-1 where it is not, as older instruments write their µ. */
export function textOf(bytes: Uint8Array, start: number, end: number): string {
  const part = bytes.subarray(start, end)
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(part)
  } catch {
    return Array.from(part, (byte) => String.fromCharCode(byte)).join('')
  }
}

const looked = 65_536

/** Whether the beginning holds bytes that no text has: NUL (also of UTF-16) or other control characters. */
export function looksBinary(bytes: Uint8Array): boolean {
  return bytes.subarray(0, looked).some((byte) => byte < ascii.tab || (byte > 13 && byte < ascii.space))
}
