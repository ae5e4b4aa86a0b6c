import { PdfScanner } from './pdf-scanner'
import type { PdfDictionary, PdfObject, Span } from './pdf-value'
import { readValue } from './pdf-value-reader'

/**
 * Reads the indirect object that the cross-reference table places at `offset` (ISO 32000-1, 7.3.10).
 * `lengthOf` gives the value of an object that holds a stream's length.
 */
export function readObject(
  bytes: Uint8Array,
  offset: number,
  number: number,
  lengthOf: (object: number) => number | null,
): PdfObject {
  const scanner = new PdfScanner(bytes, offset)
  if (!scanner.accept(`${number} 0 obj`)) scanner.fail(`object ${number} is missing`)
  const value = readValue(scanner)
  scanner.skipWhiteSpace()
  const stream = scanner.startsWith('stream') ? readStream(scanner, value, lengthOf) : null
  scanner.expectKeyword('endobj')
  return { number, value, stream, start: offset, end: scanner.position }
}

function readStream(
  scanner: PdfScanner,
  value: PdfObject['value'],
  lengthOf: (object: number) => number | null,
): Span {
  if (value.kind !== 'dictionary') return scanner.fail('a stream without its dictionary')
  const length = streamLength(value, lengthOf)
  scanner.expect('stream')
  if (!scanner.accept('\r\n')) scanner.expect('\n')
  const start = scanner.position
  if (length === null || start + length > scanner.bytes.length)
    return scanner.fail('a stream without a length')
  scanner.position = start + length
  scanner.expectKeyword('endstream')
  return { start, end: start + length }
}

function streamLength(dictionary: PdfDictionary, lengthOf: (object: number) => number | null): number | null {
  const length = dictionary.entries.get('Length')
  if (length?.kind === 'reference') return lengthOf(length.object)
  return length?.kind === 'number' && Number.isInteger(length.value) && length.value >= 0
    ? length.value
    : null
}
