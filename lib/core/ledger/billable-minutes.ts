import { minutes, type Minutes } from './minutes'

/** Tenths of an hour: common practice, no source. */
export const usualIncrement = 6

/**
 * The minutes that worked time counts for: every increment that was begun. 0 s counts for nothing.
 * Whole seconds, not negative; the increment in whole minutes, at least 1.
 */
export function billableMinutes(workedSeconds: number, increment: number = usualIncrement): Minutes {
  if (workedSeconds < 0 || increment < 1) throw new RangeError('Worked time cannot be negative')
  return minutes(Math.ceil(workedSeconds / (60 * increment)) * increment)
}
