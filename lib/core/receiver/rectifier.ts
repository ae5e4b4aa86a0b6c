import type { EnvelopeCycle } from './envelope-cycle'
import type { QuasiPeakTimes } from './bands'

/**
 * The rectifier of a quasi-peak detector. A diode behind a source resistance charges a capacitor while the carrier E is
 * above its voltage U, over a conduction angle θ with cos θ = U/E; a resistance discharges it:
 *
 *     dU/dt = (k/π)(E sin θ − θ U) − U/T_D
 *
 * Source: circuit of CISPR 16-1-1 (from memory).
 */
export type Rectifier = {
  /** k, the inverse of source resistance times capacitance, in 1/s. */
  readonly chargeRate: number
  readonly discharge: number
  /** The voltage that a steady carrier of 1 V charges to. */
  readonly efficiency: number
}

const made = new WeakMap<QuasiPeakTimes, Rectifier>()

/** A rectifier that a suddenly applied sine charges to 63.2 % of its final voltage in the given time. */
export function rectifierOf(times: QuasiPeakTimes): Rectifier {
  const rectifier = made.get(times) ?? makeRectifier(times)
  made.set(times, rectifier)
  return rectifier
}

function makeRectifier({ charge, discharge }: QuasiPeakTimes): Rectifier {
  // The charge in the given time rises with k, so that halving finds it.
  let low = 1 / charge
  let high = 1e4 / charge
  for (let halving = 0; halving < 60; halving += 1) {
    const chargeRate = Math.sqrt(low * high)
    const rectifier = { chargeRate, discharge, efficiency: steadyVoltage(chargeRate, discharge) }
    const reached = chargedIn(rectifier, charge)
    if (reached < (1 - Math.exp(-1)) * rectifier.efficiency) low = chargeRate
    else high = chargeRate
  }
  const chargeRate = Math.sqrt(low * high)
  return { chargeRate, discharge, efficiency: steadyVoltage(chargeRate, discharge) }
}

/** The voltage after each point of an envelope, from a voltage at its first point on. */
export function charge(
  { chargeRate, discharge }: Rectifier,
  { amplitudes, step }: Pick<EnvelopeCycle, 'amplitudes' | 'step'>,
  initial: number,
): Float64Array {
  const voltages = new Float64Array(amplitudes.length)
  const slope = (envelope: number, voltage: number): number =>
    chargeRate * conduction(envelope, voltage) - voltage / discharge
  let voltage = initial
  voltages[0] = voltage
  for (let index = 1; index < amplitudes.length; index += 1) {
    const before = amplitudes[index - 1] ?? 0
    const after = amplitudes[index] ?? 0
    const middle = (before + after) / 2
    const k1 = slope(before, voltage)
    const k2 = slope(middle, voltage + (step / 2) * k1)
    const k3 = slope(middle, voltage + (step / 2) * k2)
    const k4 = slope(after, voltage + step * k3)
    voltage += (step / 6) * (k1 + 2 * k2 + 2 * k3 + k4)
    voltages[index] = voltage
  }
  return voltages
}

/** (E sin θ − θ U)/π, and 0 while the carrier stays below the voltage. */
function conduction(envelope: number, voltage: number): number {
  if (!(envelope > voltage)) return 0
  const angle = Math.acos(voltage / envelope)
  return (envelope * Math.sin(angle) - angle * voltage) / Math.PI
}

function steadyVoltage(chargeRate: number, discharge: number): number {
  let low = 0
  let high = 1
  for (let halving = 0; halving < 60; halving += 1) {
    const middle = (low + high) / 2
    if (chargeRate * conduction(1, middle) > middle / discharge) low = middle
    else high = middle
  }
  return (low + high) / 2
}

function chargedIn(rectifier: Rectifier, duration: number): number {
  const points = 2000
  const amplitudes = new Float64Array(points + 1).fill(1)
  return charge(rectifier, { amplitudes, step: duration / points }, 0)[points] ?? 0
}
