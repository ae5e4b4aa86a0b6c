/** A train of trapezoidal pulses from 0 to `amplitude`, with straight edges from 0 to 100 %; SI units. */
export type PulseTrain = {
  readonly amplitude: number
  readonly period: number
  /** At half of the amplitude. */
  readonly width: number
  readonly rise: number
  readonly fall: number
}

/** sin(πx)/(πx). */
export const sinc = (x: number): number => (x === 0 ? 1 : Math.sin(Math.PI * x) / (Math.PI * x))

/**
 * The peak value of the n-th harmonic, in volts:
 *
 *     2|c_n| = A/(πn) · |sinc(n tr/T) − sinc(n tf/T) exp(−j 2πn τ/T)|
 *
 * Exact Fourier coefficient. With unequal edges the even harmonics of a square wave do not vanish.
 */
export function harmonicPeak({ amplitude, period, width, rise, fall }: PulseTrain, n: number): number {
  const onRise = sinc((n * rise) / period)
  const onFall = sinc((n * fall) / period)
  const angle = 2 * Math.PI * ((n * width) / period)
  // |a − b e^(−jφ)|² = (a − b)² + 4ab sin²(φ/2), which keeps its digits where the two nearly cancel.
  const square = (onRise - onFall) ** 2 + 4 * onRise * onFall * Math.sin(angle / 2) ** 2
  return (amplitude / (Math.PI * n)) * Math.sqrt(Math.max(0, square))
}

export type Envelope = {
  /** Peak volts up to the first corner. */
  readonly plateau: number
  readonly firstCorner: number
  readonly secondCorner: number
}

/** The corners of the envelope: 2A τ/T up to 1/(πτ), −20 dB a decade up to 1/(π t) of the faster edge t, then −40. */
export function envelopeOf({ amplitude, period, width, rise, fall }: PulseTrain): Envelope {
  return {
    plateau: (2 * amplitude * width) / period,
    firstCorner: 1 / (Math.PI * width),
    secondCorner: 1 / (Math.PI * Math.min(rise, fall)),
  }
}

/** The envelope at a frequency, as the peak value of a harmonic in volts. */
export function envelopeAt({ plateau, firstCorner, secondCorner }: Envelope, frequency: number): number {
  const slope = (corner: number) => Math.min(1, corner / frequency)
  return plateau * slope(firstCorner) * slope(secondCorner)
}
