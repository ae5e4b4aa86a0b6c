declare const cent: unique symbol

/** An amount of money in the minor unit of its currency: a whole number, exact as long as it is below 2⁵³. */
export type Cents = number & { readonly [cent]: true }

/** Vouches that a number is a whole amount of cents; anything else is a bug in the caller. */
export function cents(value: number): Cents {
  if (!Number.isSafeInteger(value)) throw new RangeError(`${value} is not a whole amount of cents`)
  return value as Cents
}

/** The sum of amounts of one currency. */
export const sumOfCents = (amounts: readonly Cents[]): Cents =>
  cents(amounts.reduce((sum: number, amount) => sum + amount, 0))
