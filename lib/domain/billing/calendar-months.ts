/**
 * The same day and time of day (UTC) a number of calendar months later; the last day of the month where that month is
 * shorter, so that 31 January plus one month is 28 or 29 February.
 */
export function afterMonths(instant: number, months: number): number {
  const date = new Date(instant)
  const day = date.getUTCDate()
  const target = new Date(instant)
  target.setUTCDate(1)
  target.setUTCMonth(date.getUTCMonth() + months)
  const lastDay = new Date(Date.UTC(target.getUTCFullYear(), target.getUTCMonth() + 1, 0)).getUTCDate()
  target.setUTCDate(Math.min(day, lastDay))
  return target.getTime()
}
