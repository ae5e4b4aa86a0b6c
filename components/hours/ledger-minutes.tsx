const noBreak = '\u00a0'

/** Minutes for a column: hours and two digits of minutes always, so that they line up: "−0 h 36 min", "10 h 00 min". */
export const LedgerMinutes = ({ minutes }: { readonly minutes: number }) => {
  const size = Math.abs(minutes)
  return (
    <span className="num">
      {minutes < 0 ? '−' : ''}
      {Math.floor(size / 60)}
      <span className="unit">{`${noBreak}h${noBreak}`}</span>
      {String(size % 60).padStart(2, '0')}
      <span className="unit">{`${noBreak}min`}</span>
    </span>
  )
}
