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

const twoDigits = (value: number): string => value.toString().padStart(2, '0')

/** "1 December 2026" for an instant in UTC milliseconds. */
export const writtenDay = (instant: number): string => {
  const date = new Date(instant)
  return `${date.getUTCDate()} ${months[date.getUTCMonth()] ?? ''} ${date.getUTCFullYear()}`
}

/** "1 December 2026, 10:24 UTC". */
export const writtenInstant = (instant: number): string => {
  const date = new Date(instant)
  return `${writtenDay(instant)}, ${twoDigits(date.getUTCHours())}:${twoDigits(date.getUTCMinutes())} UTC`
}

/** "1,234.50 EUR" for integer cents. */
export const writtenMoney = (cents: number, currency: string): string => {
  const size = Math.abs(cents)
  const whole = Math.floor(size / 100)
    .toString()
    .replace(/\B(?=(\d{3})+$)/g, ',')
  return `${cents < 0 ? '−' : ''}${whole}.${twoDigits(size % 100)} ${currency}`
}

/** "12 h 30 min" for integer minutes. */
export const writtenHours = (minutes: number): string => {
  const size = Math.abs(minutes)
  const hours = Math.floor(size / 60)
  const rest = size % 60
  const parts = [...(hours > 0 ? [`${hours} h`] : []), ...(rest > 0 || hours === 0 ? [`${rest} min`] : [])]
  return `${minutes < 0 ? '−' : ''}${parts.join(' ')}`
}
