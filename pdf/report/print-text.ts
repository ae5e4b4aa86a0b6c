const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const

/** "1 December 2026" for an instant in UTC milliseconds. */
export function dayText(instant: number): string {
  const date = new Date(instant)
  return `${date.getUTCDate()} ${months[date.getUTCMonth()] ?? ''} ${date.getUTCFullYear()}`
}

/** "1 December 2026, 10:24 UTC". */
export const instantText = (instant: number): string =>
  `${dayText(instant)}, ${new Date(instant).toISOString().slice(11, 16)} UTC`

/** "12 h 30 min". */
export const durationText = (minutes: number): string => `${Math.floor(minutes / 60)} h ${minutes % 60} min`

/** 499,435 */
export const grouped = (count: number): string => count.toString().replace(/\B(?=(\d{3})+$)/g, ',')
