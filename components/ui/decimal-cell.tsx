/** A number as written and its unit; a column of them lines up on the decimal sign. */
export type Figures = { readonly number: string; readonly unit?: string | undefined }

/** Places after the decimal sign, the sign itself counted. */
const tail = (figures: Figures): number => {
  const point = figures.number.indexOf('.')
  return point < 0 ? 0 : figures.number.length - point
}

export type DecimalFit = { readonly tail: number; readonly unit: number }

/** The widest tail and the widest unit of a column; every cell is padded to them. */
export const fitDecimals = (cells: readonly (Figures | null)[]): DecimalFit => ({
  tail: Math.max(0, ...cells.map((cell) => (cell ? tail(cell) : 0))),
  unit: Math.max(0, ...cells.map((cell) => cell?.unit?.length ?? 0)),
})

const blank = (length: number) =>
  length > 0 ? <span aria-hidden="true">{'\u00a0'.repeat(length)}</span> : null

type DecimalCellProps = { readonly figures: Figures | null; readonly fit: DecimalFit }

/** Padded with blanks of the monospaced face, as inline widths are not allowed by our content policy. */
export const DecimalCell = ({ figures, fit }: DecimalCellProps) => {
  if (figures === null) return <span className="text-ink-faint">–</span>
  const unit = figures.unit ?? ''
  return (
    <span className="num">
      {figures.number}
      {blank(fit.tail - tail(figures))}
      {fit.unit > 0 ? (
        <span className="text-ink-faint">
          {'\u00a0'}
          {unit}
        </span>
      ) : null}
      {blank(fit.unit - unit.length)}
    </span>
  )
}
