/** What a bandpass filter is, seen by a sine, by noise and by a short pulse; Hz. */
export type FilterBandwidths = {
  /** Width at −3 dB. */
  readonly width3dB: number
  /** Peak of the envelope over twice the area of an impulse. */
  readonly impulse: number
  /** Equivalent noise bandwidth. */
  readonly noise: number
}

/** A filter with a Gaussian passband of width `b6` at −6 dB (half the amplitude): |H| = exp(−ln 2 (2f/B₆)²). */
export const gaussianBandwidths = (b6: number): FilterBandwidths => ({
  width3dB: b6 / Math.SQRT2,
  impulse: (b6 / 2) * Math.sqrt(Math.PI / Math.LN2),
  noise: b6 * Math.sqrt(Math.PI / (8 * Math.LN2)),
})

/** ω₀ of two critically coupled double-tuned stages, in rad/s: the width at half the amplitude is √2 ω₀/π. */
export const cornerOf = (b6: number): number => (Math.PI * b6) / Math.SQRT2

/**
 * Two critically coupled double-tuned stages in a row, the selectivity that CISPR 16-1-1 assumes:
 *
 *     |H| = 4ω₀⁴/(4ω₀⁴ + ω⁴),   B₃ = B₆ (√2 − 1)^¼,   B_noise = 3ω₀/8,   B_imp = 2ω₀ max e^(−x)(sin x − x cos x)
 *
 * The impulse bandwidth is 1.0482 B₆; the standard gives 1.05 B₆ (from memory).
 */
export const coupledStagesBandwidths = (b6: number): FilterBandwidths => ({
  width3dB: b6 * (Math.SQRT2 - 1) ** 0.25,
  impulse: 2 * cornerOf(b6) * impulseShape(impulsePeakAt),
  noise: (3 / 8) * cornerOf(b6),
})

/** The envelope that an impulse leaves behind the two stages, over time in units of 1/ω₀; changes its sign. */
export const impulseShape = (x: number): number => Math.exp(-x) * (Math.sin(x) - x * Math.cos(x))

/** Where the envelope is greatest: (x − 1) sin x + x cos x = 0 between 1 and π. */
const impulsePeakAt = ((): number => {
  let low = 1
  let high = Math.PI
  for (let halving = 0; halving < 60; halving += 1) {
    const middle = (low + high) / 2
    if ((middle - 1) * Math.sin(middle) + middle * Math.cos(middle) > 0) low = middle
    else high = middle
  }
  return (low + high) / 2
})()

/**
 * The gain of the two stages `offset` Hz away from the frequency to which they are tuned, real and imaginary:
 *
 *     H = (2ω₀²/((ω₀ + jω)² + ω₀²))²
 */
export function coupledStagesGain(b6: number, offset: number): readonly [number, number] {
  const corner = cornerOf(b6)
  const omega = 2 * Math.PI * offset
  const real = 2 * corner ** 2 - omega ** 2
  const imaginary = 2 * corner * omega
  const scale = (2 * corner ** 2) / (real ** 2 + imaginary ** 2)
  const oneR = scale * real
  const oneI = -scale * imaginary
  return [oneR ** 2 - oneI ** 2, 2 * oneR * oneI]
}
