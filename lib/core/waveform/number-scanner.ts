import { ascii } from './ascii'

/** Powers of ten that a 64-bit floating-point number holds exactly. */
const exactPowers = Float64Array.from({ length: 23 }, (_, power) => Number(`1e${power}`))

/** A whole number of so many decimal digits is below 2⁵³ and therefore exact. */
const exactDigits = 15

/** Beyond this the value is 0 or infinite whatever the digits are; it keeps the running exponent a small integer. */
const exponentCap = 100_000_000

/** An `e` without digits after it. */
const noExponent = exponentCap + 1

/**
 * Reads decimal numbers out of bytes: sign, digits, one decimal mark, digits, exponent. The value equals `Number(text)`
 * bit for bit: up to 15 digits and a power of ten up to 10²² make one correctly rounded operation on exact operands
 * (W. D. Clinger, "How to Read Floating Point Numbers Accurately", PLDI 1990); all else goes to `Number` itself.
 */
export class NumberScanner {
  /** Where the last number ended. */
  end = 0
  private markAt = -1

  /** `mark` is the byte between units and tenths; 0 takes a point or a comma, whichever comes first, for all numbers. */
  constructor(
    private readonly bytes: Uint8Array,
    private mark: number = ascii.point,
  ) {}

  /** The number that starts at `start`, or NaN where there is none. ±Infinity means that it is too large. */
  read(start: number): number {
    const bytes = this.bytes
    const first = bytes[start]
    const from = first === ascii.minus || first === ascii.plus ? start + 1 : start
    let position = from
    let mantissa = 0
    let digits = 0
    let markAt = -1
    for (;;) {
      const digit = (bytes[position] ?? 0) - ascii.zero
      if (digit >= 0 && digit <= 9) {
        mantissa = mantissa * 10 + digit
        if (digits > 0 || digit > 0) digits += 1
      } else if (markAt < 0 && this.isMark(bytes[position])) {
        markAt = position
      } else break
      position += 1
    }
    this.end = position
    this.markAt = markAt
    if (position - from - (markAt < 0 ? 0 : 1) === 0) return NaN
    const exponent = this.readExponent()
    const power = exponent - (markAt < 0 ? 0 : position - markAt - 1)
    if (exponent === noExponent) return NaN
    if (digits > exactDigits || power > 22 || power < -22) return this.convert(start)
    const size = power < 0 ? mantissa / (exactPowers[-power] ?? 1) : mantissa * (exactPowers[power] ?? 1)
    return first === ascii.minus ? -size : size
  }

  private isMark(byte: number | undefined): boolean {
    if (byte !== ascii.point && byte !== ascii.comma) return false
    if (this.mark === 0) this.mark = byte
    return byte === this.mark
  }

  private readExponent(): number {
    const bytes = this.bytes
    let position = this.end
    if (bytes[position] !== ascii.lowerE && bytes[position] !== ascii.upperE) return 0
    position += 1
    const sign = bytes[position]
    if (sign === ascii.minus || sign === ascii.plus) position += 1
    const from = position
    let exponent = 0
    for (;;) {
      const digit = (bytes[position] ?? 0) - ascii.zero
      if (digit < 0 || digit > 9) break
      exponent = Math.min(exponentCap, exponent * 10 + digit)
      position += 1
    }
    this.end = position
    if (position === from) return noExponent
    return sign === ascii.minus ? -exponent : exponent
  }

  private convert(start: number): number {
    let text = ''
    for (let position = start; position < this.end; position += 1) {
      text += position === this.markAt ? '.' : String.fromCharCode(this.bytes[position] ?? 0)
    }
    return Number(text)
  }
}
