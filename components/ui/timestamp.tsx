const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const
const twoDigits = (value: number): string => value.toString().padStart(2, '0')

/** "1 Dec 2026" for an instant in UTC milliseconds; the same on the server and in every browser. */
export const dayInWords = (instant: number): string => {
  const date = new Date(instant)
  return `${date.getUTCDate()} ${months[date.getUTCMonth()] ?? ''} ${date.getUTCFullYear()}`
}

/** "1 Dec 2026, 10:24 UTC". */
export const instantInWords = (instant: number): string => {
  const date = new Date(instant)
  return `${dayInWords(instant)}, ${twoDigits(date.getUTCHours())}:${twoDigits(date.getUTCMinutes())} UTC`
}

type TimestampProps = {
  /** UTC milliseconds. */
  readonly instant: number
  /** The day alone. */
  readonly dayOnly?: boolean | undefined
}

export const Timestamp = ({ instant, dayOnly = false }: TimestampProps) => {
  const iso = new Date(instant).toISOString()
  return (
    <time dateTime={dayOnly ? iso.slice(0, 10) : iso} className="whitespace-nowrap tabular-nums">
      {dayOnly ? dayInWords(instant) : instantInWords(instant)}
    </time>
  )
}
