import { err, ok, type Result } from '@/lib/core/result'

import type { PdfFile, PdfRevision } from './pdf-file'
import { readObject } from './pdf-object-reader'
import { PdfScanner } from './pdf-scanner'
import { type CrossReferenceSection, readSection } from './pdf-section-reader'
import { PdfSyntaxError } from './pdf-syntax-error'
import type { PdfObject } from './pdf-value'

export type PdfFileError = {
  readonly code: 'not_a_pdf' | 'too_large' | 'unreadable'
  readonly message: string
}

/** Larger files are not read: the work on a hostile file stays bounded. */
export const DEFAULT_MAXIMUM_BYTES = 64 * 1024 * 1024
const MOST_OBJECTS = 100_000
const MOST_REVISIONS = 64

/**
 * Reads a PDF strictly, through its cross-reference tables only, with the places of all values.
 *
 * It takes what the portal writes (classic tables, each save closed by its own %%EOF, objects inside their save) and
 * refuses the rest, so that no byte can be read in two ways. The work is linear in the size of the file.
 * Errors: `not_a_pdf`, `too_large`, `unreadable`. Source: ISO 32000-1:2008, 7.5.
 */
export function readPdfFile(
  bytes: Uint8Array,
  maximumBytes = DEFAULT_MAXIMUM_BYTES,
): Result<PdfFile, PdfFileError> {
  if (Buffer.from(bytes.subarray(0, 5)).toString('latin1') !== '%PDF-') {
    return err({
      code: 'not_a_pdf',
      message: 'This file is not a PDF: it does not begin as one. Check that you chose the report.',
    })
  }
  if (bytes.length > maximumBytes) {
    const limit = Math.floor(maximumBytes / 1024 / 1024)
    return err({
      code: 'too_large',
      message: `This file is larger than the ${limit} MB that can be checked here.`,
    })
  }
  try {
    return ok({ bytes, revisions: readRevisions(bytes) })
  } catch (error) {
    if (!(error instanceof PdfSyntaxError)) throw error
    return err({
      code: 'unreadable',
      message: `The structure of this PDF is damaged or was not written by the portal (${error.message}). Download the report again.`,
    })
  }
}

function readRevisions(bytes: Uint8Array): PdfRevision[] {
  const sections = readSections(bytes)
  const revisions: PdfRevision[] = []
  let objectBytes = 0
  for (const section of sections) {
    const floor = revisions.at(-1)?.end ?? 0
    const objects = new Map<number, PdfObject>()
    for (const [number, offset] of section.inUse) {
      if (offset < floor || offset >= section.offset) {
        throw new PdfSyntaxError(offset, `object ${number} stands outside its save`)
      }
      const object = readObject(bytes, offset, number, (length) => lengthObject(bytes, section, length))
      objectBytes += object.end - object.start
      // Objects that overlap would let a small file ask for much work.
      if (objectBytes > bytes.length) throw new PdfSyntaxError(offset, 'objects overlap')
      objects.set(number, object)
    }
    revisions.push({ ...section, objects })
  }
  return revisions
}

function lengthObject(bytes: Uint8Array, section: CrossReferenceSection, number: number): number | null {
  const offset = section.inUse.get(number)
  if (offset === undefined) return null
  const scanner = new PdfScanner(bytes, offset)
  scanner.expect(`${number} 0 obj`)
  return scanner.unsignedInteger()
}

/** All sections, oldest first, following /Prev from the end of the file. */
function readSections(bytes: Uint8Array): CrossReferenceSection[] {
  const sections: CrossReferenceSection[] = []
  let offset: number | null = lastSectionOffset(bytes)
  while (offset !== null) {
    const newer = sections[0]
    if (newer && !(Number.isInteger(offset) && offset >= 0 && offset < newer.offset)) {
      throw new PdfSyntaxError(newer.offset, 'the saves are out of order')
    }
    if (sections.length >= MOST_REVISIONS) throw new PdfSyntaxError(offset, 'too many saves')
    const section = readSection(bytes, offset, MOST_OBJECTS)
    if (newer && section.end > newer.offset) throw new PdfSyntaxError(offset, 'the saves overlap')
    sections.unshift(section)
    offset = section.previous
  }
  return sections
}

function lastSectionOffset(bytes: Uint8Array): number {
  const tail = Buffer.from(bytes.subarray(-64)).toString('latin1')
  const mark = /startxref\s+(\d{1,10})\s+%%EOF(\s*)$/.exec(tail)
  if (!mark) throw new PdfSyntaxError(bytes.length, 'the end mark is missing')
  const offset = Number(mark[1])
  const end = bytes.length - (mark[2] ?? '').length
  if (readSection(bytes, offset, MOST_OBJECTS).end !== end) {
    throw new PdfSyntaxError(end, 'the end mark belongs to another save')
  }
  return offset
}
