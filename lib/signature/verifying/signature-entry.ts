import type { PdfFile } from '../pdf/pdf-file'
import { parsePdfDate } from '../pdf/pdf-date'
import { textOf } from '../pdf/pdf-text'
import type { PdfString, PdfValue } from '../pdf/pdf-value'
import type { FormField } from '../pdf/signature-fields'

export type SignedField = FormField & { readonly signature: NonNullable<FormField['signature']> }

/** What a signed field states about itself; nothing of it is trusted yet. */
export type SignatureEntry = {
  readonly field: SignedField
  /** The place of the container, if the byte range leaves out exactly that; null where the range is malformed. */
  readonly range: { readonly gapStart: number; readonly gapEnd: number; readonly end: number } | null
  readonly container: PdfString | null
  /** The save that the byte range ends with; null where it ends anywhere else. */
  readonly revision: number | null
  readonly signedAt: number | null
  readonly reason: string | null
  readonly statedName: string | null
}

export function readSignatureEntry(file: PdfFile, field: SignedField): SignatureEntry {
  const { entries } = field.signature.dictionary
  const contents = entries.get('Contents')
  const container = contents?.kind === 'string' && contents.notation === 'hex' ? contents : null
  const range = readRange(file, entries.get('ByteRange'), container)
  return {
    field,
    range,
    container,
    revision: range ? revisionOf(file, field, range.end) : null,
    signedAt: parsePdfDate(textOf(entries.get('M')) ?? ''),
    reason: textOf(entries.get('Reason')),
    statedName: textOf(entries.get('Name')),
  }
}

/** Four whole numbers, written in place, from 0 to the container and from its other end to inside the file. */
function readRange(
  file: PdfFile,
  value: PdfValue | undefined,
  container: PdfString | null,
): SignatureEntry['range'] {
  if (value?.kind !== 'array' || value.items.length !== 4 || !container) return null
  const numbers = value.items.map((item) =>
    item.kind === 'number' && /^\d+$/.test(item.text) ? item.value : NaN,
  )
  const [start, gapStart, gapEnd, length] = numbers
  if (start !== 0 || gapStart !== container.start || gapEnd !== container.end || length === undefined)
    return null
  const end = gapEnd + length
  return end <= file.bytes.length ? { gapStart, gapEnd, end } : null
}

/** The save that ends at `end`, provided that it wrote this very signature. */
function revisionOf(file: PdfFile, field: SignedField, end: number): number | null {
  const index = file.revisions.findIndex((revision) => revision.end === end)
  const own = file.revisions[index]?.objects.get(field.signature.object.number)
  return own?.start === field.signature.object.start ? index : null
}
