import { minimiseOn } from '../linear/minimise'

/** A current I that is interrupted in L while a source E drives on, with Rs and Cs in series across the switch; SI. */
export type InterruptedCurrent = {
  readonly source: number
  readonly inductance: number
  readonly current: number
  readonly snubberCapacitance: number
}

export type InterruptOptimum = {
  /** χ = (I/E) √(L/C). */
  readonly currentFactor: number
  /** ζ = (R/2) √(C/L) of the least peak. */
  readonly dampingRatio: number
  readonly resistance: number
  /** The least peak voltage over the switch. */
  readonly peakVoltage: number
}

/**
 * The peak of the voltage over the switch, as a multiple of E. With e = E − L di/dt the excess y = e/E − 1 follows
 * y″ + 2ζy′ + y = 0 (time in √(LC)), y(0) = 2ζχ − 1, y′(0) = χ(1 − 4ζ²) + 2ζ, so its extremes are in closed form:
 *
 *     tan(ωt)/ω = y′(0)/(ζy′(0) + y(0)),   ω = √(1 − ζ²);   tanh in place of tan above ζ = 1
 *
 * Derived for this circuit: no capacitance of the switch itself. χ ≥ 0, ζ > 0.
 */
export const interruptPeak = (currentFactor: number, dampingRatio: number): number =>
  1 + interruptExcess(currentFactor, dampingRatio)

/** How far the peak exceeds E, as a multiple of E: small currents leave little of it beside the 1. */
function interruptExcess(currentFactor: number, dampingRatio: number): number {
  const start = 2 * dampingRatio * currentFactor - 1
  const slope = currentFactor * (1 - 4 * dampingRatio ** 2) + 2 * dampingRatio
  const crests = crestTimes(dampingRatio, start, slope).map((time) =>
    excessAt(dampingRatio, start, slope, time),
  )
  // Long after, the voltage is that of the source.
  return Math.max(start, 0, ...crests)
}

/** The first two instants at which the excess neither rises nor falls. */
function crestTimes(dampingRatio: number, start: number, slope: number): readonly number[] {
  const [over, under] = [slope, dampingRatio * slope + start]
  if (dampingRatio < 1) {
    const omega = Math.sqrt(1 - dampingRatio ** 2)
    const angle = Math.atan2(omega * over, under)
    const first = angle < 0 ? angle + Math.PI : angle
    return [first / omega, (first + Math.PI) / omega]
  }
  if (over * under <= 0) return []
  const rate = Math.sqrt(dampingRatio ** 2 - 1)
  if (rate === 0) return [over / under]
  // artanh of the ratio, without the cancellation that a large damping brings.
  const rest = start + slope / (rate + dampingRatio)
  return rest * under > 0 ? [Math.log((under + rate * over) / rest) / (2 * rate)] : []
}

function excessAt(dampingRatio: number, start: number, slope: number, time: number): number {
  const rest = slope + dampingRatio * start
  if (dampingRatio < 1) {
    const omega = Math.sqrt(1 - dampingRatio ** 2)
    const swing = start * Math.cos(omega * time) + (rest * Math.sin(omega * time)) / omega
    return Math.exp(-dampingRatio * time) * swing
  }
  const rate = Math.sqrt(dampingRatio ** 2 - 1)
  if (rate === 0) return Math.exp(-time) * (start + rest * time)
  const grown = Math.exp(-time / (rate + dampingRatio))
  const shrunk = Math.exp(-(rate + dampingRatio) * time)
  return (start * (grown + shrunk)) / 2 + (rest * (grown - shrunk)) / (2 * rate)
}

/** The optimum lies between: near 0.25 for large currents, and at ½/χ, where the voltage starts at E, for small ones. */
const searchedDamping = (currentFactor: number): readonly [low: number, high: number] => [
  0.1,
  1 + 1 / currentFactor,
]

const coarse = 120

/**
 * The snubber resistor with the least peak voltage when a current is interrupted, by search over the exact peak. This is
 * another problem than a ringing node with a capacitance of its own and no current at the start: neither resistor does
 * for the other. Needs I > 0: without a current no resistor is the best. After W. McMurray, “Optimum Snubbers for Power Semiconductors”, IEEE Trans. Industry Applications
 * IA-8, 1972, 593-600 (bibliographic data seen; the numbers are derived here).
 */
export function interruptOptimum(given: InterruptedCurrent): InterruptOptimum {
  const impedance = Math.sqrt(given.inductance / given.snubberCapacitance)
  const currentFactor = (given.current / given.source) * impedance
  const excessOf = (logDamping: number) => interruptExcess(currentFactor, Math.exp(logDamping))
  const [low, high] = searchedDamping(currentFactor).map(Math.log) as [number, number]
  const step = (high - low) / coarse
  let best = low
  for (let index = 1; index <= coarse; index += 1) {
    const candidate = low + index * step
    if (excessOf(candidate) < excessOf(best)) best = candidate
  }
  const dampingRatio = Math.exp(minimiseOn(excessOf, best - step, best + step, 1e-10))
  return {
    currentFactor,
    dampingRatio,
    resistance: 2 * dampingRatio * impedance,
    peakVoltage: given.source * interruptPeak(currentFactor, dampingRatio),
  }
}
