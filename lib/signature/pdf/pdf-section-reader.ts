import { PdfScanner } from './pdf-scanner'
import type { PdfDictionary } from './pdf-value'
import { readValue } from './pdf-value-reader'

/** One cross-reference table with its trailer: where the objects of one save stand, and which save came before. */
export type CrossReferenceSection = {
  readonly offset: number
  readonly inUse: ReadonlyMap<number, number>
  readonly freed: ReadonlySet<number>
  readonly trailer: PdfDictionary
  readonly previous: number | null
  /** The byte after this save's %%EOF. */
  readonly end: number
}

/**
 * Reads the cross-reference table at `offset`, its trailer and its end mark (ISO 32000-1, 7.5.4 and 7.5.5).
 * Cross-reference streams, hybrid files and encryption are refused: the portal's reports use none.
 */
export function readSection(bytes: Uint8Array, offset: number, objectLimit: number): CrossReferenceSection {
  const scanner = new PdfScanner(bytes, offset)
  scanner.expectKeyword('xref')
  const { inUse, freed } = readEntries(scanner, objectLimit)
  const trailer = readTrailer(scanner)
  scanner.expectKeyword('startxref')
  if (scanner.unsignedInteger() !== offset) scanner.fail('the end of a save points to another table')
  scanner.skipWhiteSpace()
  scanner.expect('%%EOF')
  const previous = trailer.entries.get('Prev')
  if (previous !== undefined && previous.kind !== 'number')
    scanner.fail('the previous table is not given as a number')
  return {
    offset,
    inUse,
    freed,
    trailer,
    previous: previous?.kind === 'number' ? previous.value : null,
    end: scanner.position,
  }
}

function readEntries(scanner: PdfScanner, objectLimit: number) {
  const inUse = new Map<number, number>()
  const freed = new Set<number>()
  for (;;) {
    scanner.skipWhiteSpace()
    if (scanner.startsWith('trailer')) return { inUse, freed }
    const first = scanner.unsignedInteger()
    const count = scanner.unsignedInteger()
    scanner.skipWhiteSpace()
    for (let number = first; number < first + count; number++) {
      const entry = /^(\d{10}) (\d{5}) ([nf])(?: \r| \n|\r\n)$/.exec(
        Buffer.from(scanner.bytes.subarray(scanner.position, scanner.position + 20)).toString('latin1'),
      )
      if (!entry) return scanner.fail('a broken line in a cross-reference table')
      if (inUse.has(number) || freed.has(number)) scanner.fail(`object ${number} is listed twice`)
      scanner.position += 20
      if (entry[3] === 'f') freed.add(number)
      else if (entry[2] === '00000') inUse.set(number, Number(entry[1]))
      else scanner.fail('a reused object number')
      if (inUse.size + freed.size > objectLimit) scanner.fail('too many objects')
    }
  }
}

function readTrailer(scanner: PdfScanner): PdfDictionary {
  scanner.expectKeyword('trailer')
  const trailer = readValue(scanner)
  if (trailer.kind !== 'dictionary') return scanner.fail('a trailer without its dictionary')
  if (trailer.entries.has('Encrypt')) scanner.fail('the file is encrypted')
  if (trailer.entries.has('XRefStm')) scanner.fail('a second, hidden cross-reference table')
  return trailer
}
