/** The formulas that give a result: those with its symbol on the left, or all of them where none has. */
export function formulasOf(symbol: string, formulas: readonly string[]): readonly string[] {
  const own = formulas.filter((formula) =>
    leftSide(formula)
      .split(/[\s,]+/u)
      .includes(symbol),
  )
  return own.length > 0 ? own : formulas
}

const leftSide = (formula: string): string => formula.split('=')[0] ?? ''
