import type { EnvelopeCycle } from './envelope-cycle'
import { cornerOf, impulseShape } from './filter-bandwidths'

/** The response to an impulse is over after this time, in units of 1/ω₀: below 10⁻⁷ of its peak. */
const over = 20

/** Points of the envelope in 1/ω₀. */
const pointsPerCorner = 50

const fewestPoints = 64

/**
 * The envelope behind two critically coupled stages of a train of impulses of area S (volt-seconds), the receiver being
 * tuned to a harmonic of the rate, so that all pulses add in phase:
 *
 *     E(t) = |Σ a(t − nT)|,   a(t) = 4 ω₀ S e^(−ω₀t) (sin ω₀t − ω₀t cos ω₀t)
 *
 * Valid for any rate: pulses far apart answer singly, pulses much faster than the bandwidth leave one steady line of peak
 * value 2S/T. `rate` in pulses per second, 0 for a single pulse. Source: model of CISPR 16-1-1 (from memory), derived here.
 */
export function pulseEnvelope(area: number, b6: number, rate: number): EnvelopeCycle {
  const corner = cornerOf(b6)
  const period = rate > 0 ? 1 / rate : Infinity
  const span = Math.min(period, over / corner)
  const count = Math.max(fewestPoints, Math.ceil(span * corner * pointsPerCorner))
  const step = span / count
  const earlier = period === Infinity ? 0 : Math.floor(over / corner / period)
  const amplitudes = Float64Array.from({ length: count + 1 }, (_, index) => {
    const x = corner * index * step
    let sum = impulseShape(x)
    for (let pulse = 1; pulse <= earlier; pulse += 1) sum += impulseShape(x + corner * pulse * period)
    return Math.abs(4 * corner * area * sum)
  })
  return { amplitudes, step, period }
}
