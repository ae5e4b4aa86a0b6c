/** A source of numbers that look random and are the same for the same seed. */
export type RandomSource = {
  /** Evenly distributed in [0, 1), all 53 bits. */
  readonly uniform: () => number
  /** Normally distributed with mean 0 and standard deviation 1. */
  readonly normal: () => number
}

/**
 * xoshiro128** (D. Blackman, S. Vigna, Scrambled linear pseudorandom number generators, ACM TOMS 47(4), 2021) with its
 * state filled from the seed by the finaliser of MurmurHash3. Not for secrets.
 */
export function randomSource(seed: number): RandomSource {
  const next = xoshiro128([0, 1, 2, 3].map((index) => mixed(seed + Math.imul(index + 1, 0x9e3779b9))))
  const uniform = () => ((next() >>> 5) * 0x4000000 + (next() >>> 6)) / 2 ** 53
  // Box and Muller; the second deviate of each pair is given up, which keeps the source without hidden state.
  const normal = () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform())
  return { uniform, normal }
}

/** The generator itself: 32 bits a call from a state of four words that are not all zero. */
export function xoshiro128(state: readonly number[]): () => number {
  let [a = 1, b = 0, c = 0, d = 0] = state
  return () => {
    const result = Math.imul(rotated(Math.imul(b, 5), 7), 9) >>> 0
    const shifted = b << 9
    c ^= a
    d ^= b
    b ^= c
    a ^= d
    c ^= shifted
    d = rotated(d, 11)
    return result
  }
}

const rotated = (word: number, by: number): number => (word << by) | (word >>> (32 - by))

function mixed(word: number): number {
  const first = Math.imul(word ^ (word >>> 16), 0x85ebca6b)
  const second = Math.imul(first ^ (first >>> 13), 0xc2b2ae35)
  return (second ^ (second >>> 16)) >>> 0
}
