/** A column of a drawn spectrum: the strongest line in it. */
type Columns = { readonly frequencies: number[]; readonly levels: number[] }

/**
 * The strongest line of each of at most `columns` columns of equal width on a logarithmic axis, from bin 1 on, so that
 * no line is lost. `levels` are by bin, the bins `binWidth` apart in hertz.
 */
export function thinSpectrum(levels: Float64Array, binWidth: number, columns: number): Columns {
  const last = levels.length - 1
  const thinned: Columns = { frequencies: [], levels: [] }
  if (last < 1) return thinned
  const perColumn = Math.log(Math.max(2, last)) / Math.max(1, columns)
  let begin = 1
  while (begin <= last) {
    const column = Math.floor(Math.log(begin) / perColumn + 1e-9)
    const end = Math.max(begin + 1, Math.ceil(Math.exp((column + 1) * perColumn) - 1e-9))
    let strongest = begin
    for (let bin = begin + 1; bin < end && bin <= last; bin += 1) {
      if ((levels[bin] ?? -Infinity) > (levels[strongest] ?? -Infinity)) strongest = bin
    }
    thinned.frequencies.push(strongest * binWidth)
    thinned.levels.push(levels[strongest] ?? -Infinity)
    begin = end
  }
  return thinned
}
