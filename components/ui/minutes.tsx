const noBreak = '\u00a0'

/** "12 h 30 min", "45 min", "−2 h". */
export const minutesInWords = (minutes: number): string => {
  const hours = Math.floor(Math.abs(minutes) / 60)
  const rest = Math.abs(minutes) % 60
  const parts = [
    hours > 0 ? `${hours}${noBreak}h` : '',
    rest > 0 || hours === 0 ? `${rest}${noBreak}min` : '',
  ]
  return `${minutes < 0 ? '−' : ''}${parts.filter(Boolean).join(noBreak)}`
}

/** Working time, kept as integer minutes. */
export const Minutes = ({ minutes }: { readonly minutes: number }) => {
  const parts = minutesInWords(minutes).split(noBreak)
  return (
    <span className="num">
      {parts.map((part, index) => (
        <span key={index} className={index % 2 === 1 ? 'unit' : undefined}>
          {index > 0 ? noBreak : ''}
          {part}
        </span>
      ))}
    </span>
  )
}
