/** What all samples together show. */
export type ValueSummary = {
  readonly minimum: number
  readonly maximum: number
  readonly mean: number
  /** Root mean square about the mean. */
  readonly deviation: number
  /** The step of the converter: the smallest one between neighbours; 0 where the values have no steps. */
  readonly converterStep: number
}

/** Steps finer than this part of the range are the digits of the text, not those of a converter. */
const finestStep = 1 / 4096

/** One pass over a record; null where a value is not finite. */
export function summariseValues(values: Float64Array): ValueSummary | null {
  let minimum = Infinity
  let maximum = -Infinity
  let step = Infinity
  let sum = 0
  let square = 0
  const first = values[0] ?? 0
  let previous = first
  for (let index = 0; index < values.length; index += 1) {
    const value = values[index] ?? 0
    if (value < minimum) minimum = value
    if (value > maximum) maximum = value
    const size = value > previous ? value - previous : previous - value
    if (size > 0 && size < step) step = size
    previous = value
    const above = value - first
    sum += above
    square += above * above
  }
  if (!Number.isFinite(square)) return null
  const mean = sum / values.length
  return {
    minimum,
    maximum,
    mean: first + mean,
    deviation: Math.sqrt(Math.max(0, square / values.length - mean ** 2)),
    converterStep: step < Infinity && step >= finestStep * (maximum - minimum) ? step : 0,
  }
}
