import { cents, type Cents } from './cents'

/**
 * amount · numerator / denominator, rounded once to whole cents with halves away from zero. The product is exact
 * whatever its size. All three are integers and the denominator is not 0; anything else is a bug in the caller.
 */
export function proportionOf(amount: Cents, numerator: number, denominator: number): Cents {
  const product = BigInt(amount) * BigInt(numerator)
  const divisor = BigInt(denominator)
  const isNegative = product < 0n !== divisor < 0n
  const [size, over] = [absolute(product), absolute(divisor)]
  const rounded = (2n * size + over) / (2n * over)
  return cents(Number(isNegative ? -rounded : rounded) + 0)
}

const absolute = (value: bigint): bigint => (value < 0n ? -value : value)

/** The tax on a net amount at a rate in basis points (2000 is 20 %), rounded once, halves away from zero. */
export const taxOn = (net: Cents, basisPoints: number): Cents => proportionOf(net, basisPoints, 10_000)
