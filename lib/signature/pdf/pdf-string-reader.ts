import type { PdfScanner } from './pdf-scanner'

const ESCAPES: Readonly<Record<string, number>> = {
  n: 10,
  r: 13,
  t: 9,
  b: 8,
  f: 12,
  '(': 40,
  ')': 41,
  '\\': 92,
}

/** Reads a string in parentheses (ISO 32000-1, 7.3.4.2) and gives its bytes. */
export function readLiteralString(scanner: PdfScanner): Uint8Array {
  scanner.expect('(')
  const bytes: number[] = []
  for (let depth = 1; ;) {
    const byte = scanner.byte
    if (byte === undefined) return scanner.fail('a string does not end')
    scanner.position++
    if (byte === 0x5c) {
      const escaped = readEscape(scanner)
      if (escaped !== null) bytes.push(escaped)
      continue
    }
    if (byte === 0x28) depth++
    if (byte === 0x29 && --depth === 0) return Uint8Array.from(bytes)
    bytes.push(byte)
  }
}

/** The byte that follows a backslash stands for; null for a line continued. */
function readEscape(scanner: PdfScanner): number | null {
  const octal = /^[0-7]{1,3}/.exec(
    Buffer.from(scanner.bytes.subarray(scanner.position, scanner.position + 3)).toString('latin1'),
  )
  if (octal) {
    scanner.position += octal[0].length
    return parseInt(octal[0], 8) & 0xff
  }
  if (scanner.accept('\r\n') || scanner.accept('\n') || scanner.accept('\r')) return null
  const byte = scanner.byte
  if (byte === undefined) return scanner.fail('a string does not end')
  scanner.position++
  return ESCAPES[String.fromCharCode(byte)] ?? byte
}

/** Reads a string in angle brackets: an even number of hexadecimal digits and nothing else. */
export function readHexString(scanner: PdfScanner): Uint8Array {
  scanner.expect('<')
  const start = scanner.position
  const end = scanner.bytes.indexOf(0x3e, start)
  if (end < 0) return scanner.fail('a hexadecimal string does not end')
  const digits = Buffer.from(scanner.bytes.subarray(start, end)).toString('latin1')
  if (digits.length % 2 !== 0 || !/^[0-9a-fA-F]*$/.test(digits)) {
    return scanner.fail('a hexadecimal string holds something else')
  }
  scanner.position = end + 1
  return Uint8Array.from(Buffer.from(digits, 'hex'))
}

/** Reads a name such as /Type, with #xx escapes resolved, so that one name has one form. */
export function readName(scanner: PdfScanner): string {
  scanner.expect('/')
  const written = scanner.word()
  if (/#(?![0-9a-fA-F]{2})/.test(written)) return scanner.fail('a name has a broken escape')
  return written.replace(/#([0-9a-fA-F]{2})/g, (_, digits: string) =>
    String.fromCharCode(parseInt(digits, 16)),
  )
}
