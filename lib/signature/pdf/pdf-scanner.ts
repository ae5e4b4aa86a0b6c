import { PdfSyntaxError } from './pdf-syntax-error'

const WHITE_SPACE = new Set([0x00, 0x09, 0x0a, 0x0c, 0x0d, 0x20])
const DELIMITERS = new Set([...'()<>[]{}/%'].map((character) => character.charCodeAt(0)))

export const isWhiteSpace = (byte: number | undefined): boolean => byte !== undefined && WHITE_SPACE.has(byte)

const isRegular = (byte: number | undefined): boolean =>
  byte !== undefined && !WHITE_SPACE.has(byte) && !DELIMITERS.has(byte)

/** A cursor over the bytes of a file that reads words and fixed marks (ISO 32000-1, 7.2). */
export class PdfScanner {
  constructor(
    readonly bytes: Uint8Array,
    public position: number,
  ) {}

  get byte(): number | undefined {
    return this.bytes[this.position]
  }

  fail(reason: string): never {
    throw new PdfSyntaxError(this.position, reason)
  }

  skipWhiteSpace(): void {
    while (isWhiteSpace(this.byte)) this.position++
  }

  startsWith(mark: string): boolean {
    for (let index = 0; index < mark.length; index++) {
      if (this.bytes[this.position + index] !== mark.charCodeAt(index)) return false
    }
    return true
  }

  /** Reads the mark if it stands here. */
  accept(mark: string): boolean {
    if (!this.startsWith(mark)) return false
    this.position += mark.length
    return true
  }

  expect(mark: string): void {
    if (!this.accept(mark)) this.fail(`"${mark}" is missing`)
  }

  /** Reads the keyword after any white space; it must end there. */
  expectKeyword(keyword: string): void {
    this.skipWhiteSpace()
    const start = this.position
    if (this.word(keyword.length + 1) !== keyword) {
      this.position = start
      this.fail(`"${keyword}" is missing`)
    }
  }

  /** Reads a run of regular characters, at most `limit` of them. */
  word(limit = 128): string {
    const start = this.position
    while (isRegular(this.byte) && this.position - start < limit) this.position++
    return Buffer.from(this.bytes.subarray(start, this.position)).toString('latin1')
  }

  /** Reads an unsigned integer after any white space. */
  unsignedInteger(): number {
    this.skipWhiteSpace()
    const start = this.position
    const digits = this.word(16)
    if (!/^\d{1,10}$/.test(digits)) {
      this.position = start
      this.fail('a whole number is missing')
    }
    return Number(digits)
  }
}
