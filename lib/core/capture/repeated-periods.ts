/** Longer records than this are not made up. */
const mostSamples = 2 ** 22

/**
 * Whole periods from the start of a record, repeated until they make up `least` samples; null where the record holds no
 * whole period or too many samples would be needed. `period` in samples; each repeat begins at its own nearest sample.
 */
export function repeatedPeriods(values: Float64Array, period: number, least: number): Float64Array | null {
  const whole = Math.floor(values.length / period)
  if (whole < 1 || least > mostSamples) return null
  const block = whole * period
  const blocks = Math.ceil(least / block)
  const out = new Float64Array(Math.round(blocks * block))
  for (let index = 0; index < out.length; index += 1) {
    const start = Math.floor((index + 0.5) / block) * block
    out[index] = values[Math.min(values.length - 1, Math.max(0, Math.round(index - start)))] ?? 0
  }
  return out
}
