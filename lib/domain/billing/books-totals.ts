import 'server-only'

type Line = {
  readonly currency: string
  readonly grossCents: number | null
  readonly feeCents: number | null
  readonly netCents: number | null
  readonly creditedMinutes: number
  readonly debitedMinutes: number
  readonly remainingMinutes: number
}

export type Totals = {
  readonly currency: string
  readonly grossCents: number
  /** The sums of what is known; `unknownFees` payments are missing from them. */
  readonly feeCents: number
  readonly netCents: number
  readonly unknownFees: number
  readonly creditedMinutes: number
  readonly debitedMinutes: number
  readonly remainingMinutes: number
}

/** Sums of the paid purchases, apart for each currency: amounts of two currencies have no sum. */
export function totalsByCurrency(lines: readonly Line[]): Totals[] {
  const paid = lines.filter((line) => line.grossCents !== null)
  return [...new Set(paid.map((line) => line.currency))].sort().map((currency) => {
    const group = paid.filter((line) => line.currency === currency)
    const sum = (of: (line: Line) => number | null) => group.reduce((all, line) => all + (of(line) ?? 0), 0)
    return {
      currency,
      grossCents: sum((line) => line.grossCents),
      feeCents: sum((line) => line.feeCents),
      netCents: sum((line) => line.netCents),
      unknownFees: group.filter((line) => line.feeCents === null).length,
      creditedMinutes: sum((line) => line.creditedMinutes),
      debitedMinutes: sum((line) => line.debitedMinutes),
      remainingMinutes: sum((line) => line.remainingMinutes),
    }
  })
}
