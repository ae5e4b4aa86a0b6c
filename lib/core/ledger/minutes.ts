declare const minute: unique symbol

/** A span of time that is bought or worked, in whole minutes; negative where it leaves a block. */
export type Minutes = number & { readonly [minute]: true }

/** Vouches that a number is a whole amount of minutes; anything else is a bug in the caller. */
export function minutes(value: number): Minutes {
  if (!Number.isSafeInteger(value)) throw new RangeError(`${value} is not a whole number of minutes`)
  return value as Minutes
}
