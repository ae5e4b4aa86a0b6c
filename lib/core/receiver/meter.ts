/** Deflection of a meter and its speed. */
export type MeterState = { readonly deflection: number; readonly speed: number }

/**
 * A critically damped meter, T² y″ + 2T y′ + y = u, after a time in which its input runs straight from u₀ to u₁. Exact.
 */
export function moveMeter(
  { deflection, speed }: MeterState,
  timeConstant: number,
  step: number,
  before: number,
  after: number,
): MeterState {
  const slope = (after - before) / step
  const lag = 2 * timeConstant * slope
  const rate = 1 / timeConstant
  const offset = deflection - (before - lag)
  const pull = speed - slope + rate * offset
  const decay = Math.exp(-rate * step)
  return {
    deflection: after - lag + (offset + pull * step) * decay,
    speed: slope + (pull - rate * (offset + pull * step)) * decay,
  }
}

/** The state that a meter without input must start from to gain `driven` in one period and be where it began. */
export function periodicState(driven: MeterState, timeConstant: number, period: number): MeterState {
  const rate = 1 / timeConstant
  const x = rate * period
  const decay = Math.exp(-x)
  // The free movement over a period as a matrix, and (1 − M) s = driven solved for s.
  const a = 1 - (1 + x) * decay
  const b = -period * decay
  const c = rate * x * decay
  const d = 1 - (1 - x) * decay
  const determinant = a * d - b * c
  return {
    deflection: (d * driven.deflection - b * driven.speed) / determinant,
    speed: (a * driven.speed - c * driven.deflection) / determinant,
  }
}
