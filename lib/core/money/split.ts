import { cents, type Cents } from './cents'

/**
 * Splits an amount in proportion to whole weights so that the parts add up to it exactly: each gets its share rounded
 * down, and the cents left over go to the largest remainders, the earlier one first among equals (method of the largest
 * remainder). No part is further than one cent from its exact share. Weights are not negative and not all 0.
 */
export function splitByWeights(total: Cents, weights: readonly number[]): readonly Cents[] {
  const exact = weights.map((weight) => BigInt(weight))
  const sum = exact.reduce((all, weight) => all + weight, 0n)
  if (sum === 0n || exact.some((weight) => weight < 0n)) {
    throw new RangeError('Weights must not be negative, nor all of them zero')
  }
  const size = BigInt(Math.abs(total))
  const shares = exact.map((weight) => ({
    whole: (size * weight) / sum,
    remainder: (size * weight) % sum,
  }))
  const left = size - shares.reduce((all, share) => all + share.whole, 0n)
  const favoured = new Set(
    [...shares.keys()]
      .sort((a, b) => descending(shares[a]?.remainder ?? 0n, shares[b]?.remainder ?? 0n) || a - b)
      .slice(0, Number(left)),
  )
  return shares.map(({ whole }, index) =>
    cents(Math.sign(total) * (Number(whole) + (favoured.has(index) ? 1 : 0)) + 0),
  )
}

const descending = (a: bigint, b: bigint): number => (a === b ? 0 : a > b ? -1 : 1)
