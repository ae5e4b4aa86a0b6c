/**
 * One period of the envelope of a signal that repeats, behind the filter of a receiver: amplitudes (peak values of the
 * carrier, in volts) `step` seconds apart, from 0 on; after them silence until `period`.
 */
export type EnvelopeCycle = {
  readonly amplitudes: Float64Array
  readonly step: number
  /** In seconds; infinite for a single pulse. */
  readonly period: number
}

/** The mean of the envelope over its period, in volts; 0 for a single pulse. */
export function meanOf({ amplitudes, step, period }: EnvelopeCycle): number {
  if (period === Infinity) return 0
  let sum = 0
  for (let index = 1; index < amplitudes.length; index += 1) {
    sum += ((amplitudes[index - 1] ?? 0) + (amplitudes[index] ?? 0)) / 2
  }
  return (sum * step) / period
}

/** The greatest value of the envelope, in volts. */
export const peakOf = ({ amplitudes }: EnvelopeCycle): number =>
  amplitudes.reduce((most, amplitude) => Math.max(most, amplitude), 0)
