/** SI prefixes in use on a bench, as powers of ten (SI Brochure, 9th edition, table 7). */
export const prefixExponents: Readonly<Record<string, number>> = {
  a: -18,
  f: -15,
  p: -12,
  n: -9,
  u: -6,
  '\u00b5': -6,
  '\u03bc': -6,
  m: -3,
  '': 0,
  k: 3,
  K: 3,
  M: 6,
  G: 9,
  T: 12,
}

/** The symbol that is written for each power of ten; micro is U+00B5. */
export const prefixSymbols: Readonly<Record<number, string>> = {
  [-18]: 'a',
  [-15]: 'f',
  [-12]: 'p',
  [-9]: 'n',
  [-6]: '\u00b5',
  [-3]: 'm',
  0: '',
  3: 'k',
  6: 'M',
  9: 'G',
  12: 'T',
}
