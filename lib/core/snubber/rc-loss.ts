/** What a source of negligible impedance turns into heat in R and C in series; SI units. */
export type RcLoss = { readonly power: number; readonly rmsCurrent: number; readonly peakCurrent: number }

/**
 * A square wave of duty D, however incomplete the charging:
 *
 *     P = C V² f (1 − x₁)(1 − x₂)/(1 − x₁x₂),   x₁ = exp(−D T/RC),   x₂ = exp(−(1 − D) T/RC)
 *     I_peak = (V/R) max(1 − x₁, 1 − x₂)/(1 − x₁x₂)
 *
 * C V² f where both halves settle. Derived for the steady state; 0 < D < 1.
 */
export function squareWaveLoss(
  resistance: number,
  capacitance: number,
  voltage: number,
  frequency: number,
  duty = 0.5,
): RcLoss {
  const perPeriod = 1 / (frequency * resistance * capacitance)
  // 1 − exp(−x) without cancellation for a time constant that is long against the period.
  const [high, low, both] = [duty, 1 - duty, 1].map((part) => -Math.expm1(-part * perPeriod)) as [
    number,
    number,
    number,
  ]
  const power = (capacitance * voltage ** 2 * frequency * high * low) / both
  return {
    power,
    rmsCurrent: Math.sqrt(power / resistance),
    peakCurrent: ((voltage / resistance) * Math.max(high, low)) / both,
  }
}

/**
 * Two equal straight edges of duration t a period, each fully settled before the next:
 *
 *     E = C V² (τ/t) [1 − (τ/t)(1 − exp(−t/τ))] an edge,   I_peak = (C V/t)(1 − exp(−t/τ)),   τ = R C
 */
export function settledEdgeLoss(
  resistance: number,
  capacitance: number,
  voltage: number,
  frequency: number,
  edge: number,
): RcLoss {
  const ratio = (resistance * capacitance) / edge
  const charged = -Math.expm1(-1 / ratio)
  const energy = capacitance * voltage ** 2 * heatedShare(1 / ratio)
  const power = 2 * energy * frequency
  return {
    power,
    rmsCurrent: Math.sqrt(power / resistance),
    peakCurrent: ((capacitance * voltage) / edge) * charged,
  }
}

/** (x − 1 + exp(−x))/x², ½ for x → 0; a series near zero, where the difference would cancel. */
function heatedShare(x: number): number {
  if (x > 0.1) return (x + Math.expm1(-x)) / x ** 2
  let term = 1 / 2
  let sum = term
  for (let power = 3; power <= 12; power += 1) {
    term *= -x / power
    sum += term
  }
  return sum
}
