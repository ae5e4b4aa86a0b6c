import type { PdfValue } from './pdf-value'

/** The text of a string value: UTF-16 with its mark, or else one byte a character (ISO 32000-1, 7.9.2). */
export function textOf(value: PdfValue | null | undefined): string | null {
  if (value?.kind !== 'string') return null
  const { bytes } = value
  return bytes[0] === 0xfe && bytes[1] === 0xff
    ? new TextDecoder('utf-16be').decode(bytes.subarray(2))
    : Buffer.from(bytes).toString('latin1')
}
