/** The bytes that have a meaning in delimited text. */
export const ascii = {
  tab: 9,
  lineFeed: 10,
  carriageReturn: 13,
  space: 32,
  plus: 43,
  comma: 44,
  minus: 45,
  point: 46,
  zero: 48,
  nine: 57,
  semicolon: 59,
  upperE: 69,
  lowerE: 101,
} as const
