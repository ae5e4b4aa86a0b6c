type QuantityProps = {
  /** The number as written, engineering notation already applied: "2.20", "−4.1", "180.3". */
  readonly value: string
  readonly unit?: string | undefined
  /** Written after the number, e.g. "± 0.3" or "95 %: 1.9 to 2.5". */
  readonly interval?: string | undefined
}

const noBreak = '\u00a0'

/** A number in the monospaced face with its unit lighter beside it. */
export const Quantity = ({ value, unit, interval }: QuantityProps) => (
  <span className="num">
    {value}
    {interval ? <span className="text-ink-soft">{` ${interval}`}</span> : null}
    {unit ? <span className="unit">{`${noBreak}${unit}`}</span> : null}
  </span>
)
