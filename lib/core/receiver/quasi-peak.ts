import type { QuasiPeakTimes } from './bands'
import { meanOf, type EnvelopeCycle } from './envelope-cycle'
import { moveMeter, periodicState, type MeterState } from './meter'
import { charge, rectifierOf, type Rectifier } from './rectifier'

/** Points in the shortest of the slow time constants, for the silence between pulses. */
const pointsPerTime = 100

/** A meter so much slower than the pulses shows their mean, without a ripple above 10⁻⁵. */
const smoothAbove = 100

/** A single pulse is watched for so many of the slow time constants. */
const watched = 8

/** The voltage of the capacitor over one period: straight pieces between points. */
type VoltageCurve = { readonly times: readonly number[]; readonly voltages: readonly number[] }

/**
 * The quasi-peak reading of a repeating envelope: the greatest deflection of the meter in the steady state, as the peak
 * value (volts) of the steady sine that reads the same. For a single pulse, the greatest deflection after rest.
 */
export function quasiPeakOf(cycle: EnvelopeCycle, times: QuasiPeakTimes): number {
  const rectifier = rectifierOf(times)
  const isSingle = cycle.period === Infinity
  const initial = isSingle ? 0 : steadyStart(rectifier, cycle)
  const charged = charge(rectifier, cycle, initial)
  const { meter } = times
  if (cycle.period * smoothAbove < meter) return meanVoltage(rectifier, cycle, charged) / rectifier.efficiency
  const curve = voltageCurve(rectifier, cycle, charged, Math.min(meter, times.discharge))
  const rest = { deflection: 0, speed: 0 }
  const start = isSingle ? rest : periodicState(deflect(curve, meter, rest).end, meter, cycle.period)
  return deflect(curve, meter, start).most / rectifier.efficiency
}

/** The voltage at which a period begins and ends. What is left after a period rises less than what it began with. */
function steadyStart(rectifier: Rectifier, cycle: EnvelopeCycle): number {
  let low = 0
  let high = cycle.amplitudes.reduce((most, amplitude) => Math.max(most, amplitude), 0)
  for (let halving = 0; halving < 45; halving += 1) {
    const middle = (low + high) / 2
    const charged = charge(rectifier, cycle, middle).at(-1) ?? 0
    const silence = cycle.period - (cycle.amplitudes.length - 1) * cycle.step
    if (charged * Math.exp(-silence / rectifier.discharge) > middle) low = middle
    else high = middle
  }
  return (low + high) / 2
}

function meanVoltage({ discharge }: Rectifier, cycle: EnvelopeCycle, charged: Float64Array): number {
  const mean = meanOf({ ...cycle, amplitudes: charged })
  const silence = cycle.period - (charged.length - 1) * cycle.step
  const falling = (charged.at(-1) ?? 0) * discharge * -Math.expm1(-silence / discharge)
  return mean + falling / cycle.period
}

function voltageCurve(
  { discharge }: Rectifier,
  { step, period }: EnvelopeCycle,
  charged: Float64Array,
  shortest: number,
): VoltageCurve {
  const times = Array.from(charged, (_, index) => index * step)
  const voltages = Array.from(charged)
  const from = (charged.length - 1) * step
  const last = charged.at(-1) ?? 0
  const until = period === Infinity ? from + watched * discharge : period
  const count = Math.ceil(((until - from) / shortest) * pointsPerTime)
  for (let index = 1; index <= count; index += 1) {
    const later = ((until - from) * index) / count
    times.push(from + later)
    voltages.push(last * Math.exp(-later / discharge))
  }
  return { times, voltages }
}

function deflect(
  { times, voltages }: VoltageCurve,
  timeConstant: number,
  start: MeterState,
): { readonly end: MeterState; readonly most: number } {
  let state = start
  let most = state.deflection
  for (let index = 1; index < times.length; index += 1) {
    const step = (times[index] ?? 0) - (times[index - 1] ?? 0)
    if (!(step > 0)) continue
    state = moveMeter(state, timeConstant, step, voltages[index - 1] ?? 0, voltages[index] ?? 0)
    most = Math.max(most, state.deflection)
  }
  return { end: state, most }
}
