/** The lengths of which a transform is put together directly. */
export type Radix = 2 | 3 | 4 | 5

/** The radices whose product is n, fours first; null where n has a prime factor above 5. */
export function radicesOf(n: number): readonly Radix[] | null {
  const radices: Radix[] = []
  let rest = n
  for (const radix of [4, 2, 3, 5] as const) {
    while (rest % radix === 0) {
      radices.push(radix)
      rest /= radix
    }
  }
  return rest === 1 ? radices : null
}

/** The least length of at least n that is a power of two times 1, 3, 5, 9 or 15. */
export function nextSmoothLength(n: number): number {
  const candidates = [1, 3, 5, 9, 15].map((odd) => odd * 2 ** Math.max(0, Math.ceil(Math.log2(n / odd))))
  return Math.min(...candidates)
}

/** Two factors of n as near to each other as its radices allow, the smaller one first. */
export function nearSquareFactors(n: number): readonly [number, number] {
  for (let factor = Math.floor(Math.sqrt(n)); factor > 1; factor -= 1) {
    if (n % factor === 0) return [factor, n / factor]
  }
  return [1, n]
}

/** The greatest even length of at most n whose prime factors are 2, 3 and 5; n from 2. */
export function longestSmoothLength(n: number): number {
  let longest = 2
  for (let fives = 2; fives <= n; fives *= 5) {
    for (let threes = fives; threes <= n; threes *= 3) {
      const twos = threes * 2 ** Math.floor(Math.log2(n / threes))
      if (twos > longest) longest = twos
    }
  }
  return longest
}
