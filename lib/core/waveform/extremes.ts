export type Extremes = { readonly low: number; readonly high: number }

/** The smallest and the largest of the values in [from, to); +∞ and −∞ where there are none. */
export function extremesOf(values: Float64Array, from = 0, to = values.length): Extremes {
  let low = Infinity
  let high = -Infinity
  for (let index = from; index < to; index += 1) {
    const value = values[index] ?? 0
    if (value < low) low = value
    if (value > high) high = value
  }
  return { low, high }
}
