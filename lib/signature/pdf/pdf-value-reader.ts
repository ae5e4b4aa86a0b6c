import type { PdfScanner } from './pdf-scanner'
import { readHexString, readLiteralString, readName } from './pdf-string-reader'
import type { PdfArray, PdfDictionary, PdfValue } from './pdf-value'

const DEEPEST_NESTING = 64

/** Reads one value. Comments, repeated keys and references with a generation other than 0 are refused. */
export function readValue(scanner: PdfScanner, depth = 0): PdfValue {
  if (depth > DEEPEST_NESTING) scanner.fail('values are nested too deeply')
  scanner.skipWhiteSpace()
  const start = scanner.position
  if (scanner.startsWith('<<')) return readDictionary(scanner, depth)
  if (scanner.startsWith('[')) return readArray(scanner, depth)
  if (scanner.startsWith('/')) {
    const value = readName(scanner)
    return { kind: 'name', value, start, end: scanner.position }
  }
  if (scanner.startsWith('(')) {
    const bytes = readLiteralString(scanner)
    return { kind: 'string', notation: 'literal', bytes, start, end: scanner.position }
  }
  if (scanner.startsWith('<')) {
    const bytes = readHexString(scanner)
    return { kind: 'string', notation: 'hex', bytes, start, end: scanner.position }
  }
  return readWord(scanner, start)
}

function readDictionary(scanner: PdfScanner, depth: number): PdfDictionary {
  const start = scanner.position
  scanner.expect('<<')
  const entries = new Map<string, PdfValue>()
  for (;;) {
    scanner.skipWhiteSpace()
    if (scanner.accept('>>')) return { kind: 'dictionary', entries, start, end: scanner.position }
    const key = readName(scanner)
    if (entries.has(key)) scanner.fail(`the entry /${key} is there twice`)
    entries.set(key, readValue(scanner, depth + 1))
  }
}

function readArray(scanner: PdfScanner, depth: number): PdfArray {
  const start = scanner.position
  scanner.expect('[')
  const items: PdfValue[] = []
  for (;;) {
    scanner.skipWhiteSpace()
    if (scanner.accept(']')) return { kind: 'array', items, start, end: scanner.position }
    items.push(readValue(scanner, depth + 1))
  }
}

function readWord(scanner: PdfScanner, start: number): PdfValue {
  const text = scanner.word()
  const span = { start, end: scanner.position }
  if (text === 'null') return { kind: 'null', ...span }
  if (text === 'true' || text === 'false') return { kind: 'boolean', value: text === 'true', ...span }
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(text)) {
    scanner.position = start
    return scanner.fail('something that is not a value')
  }
  if (/^\d{1,10}$/.test(text) && acceptReferenceTail(scanner)) {
    return { kind: 'reference', object: Number(text), start, end: scanner.position }
  }
  return { kind: 'number', value: Number(text), text, ...span }
}

/** Reads ` 0 R` after an object number; leaves the cursor where it was if something else stands there. */
function acceptReferenceTail(scanner: PdfScanner): boolean {
  const before = scanner.position
  scanner.skipWhiteSpace()
  const generation = scanner.word(6)
  scanner.skipWhiteSpace()
  if (/^\d{1,5}$/.test(generation) && scanner.word(2) === 'R') {
    if (generation !== '0') scanner.fail('a reference to a reused object number')
    return true
  }
  scanner.position = before
  return false
}
