import { randomSource } from '@/lib/core/uncertainty/random'

/** A second-order network: undamped frequency in Hz, damping ratio below 1. */
export type RingingNetwork = { readonly naturalFrequency: number; readonly dampingRatio: number }

/** Linear edges of a pulse train behind a network; seconds, in the unit of the levels. */
export type RingingTrain = {
  readonly base: number
  readonly top: number
  readonly period: number
  /** At 50 % of the edges before the network. */
  readonly width: number
  /** From 0 to 100 %, before the network. */
  readonly riseTime: number
  readonly fallTime: number
  /** Null for the trapezoid itself. */
  readonly network: RingingNetwork | null
}

/** How a record is taken. */
export type Sampling = {
  readonly start: number
  readonly interval: number
  readonly count: number
  /** Rms of the noise. */
  readonly noise: number
  /** One step of the converter; 0 for none. */
  readonly step: number
  readonly seed: number
}

/** A ring is forgotten after so many of its time constants: 10⁻¹⁰. */
const forgotten = 23

/** Edges of so many periods before are summed at least. */
const fewestPeriods = 2

/**
 * The train at an instant: the responses to all its edges so far, summed. A linear edge of duration t_r answers with
 * [r(t) − r(t − t_r)]/t_r, r being the response of 1/(1 + 2ζ s/ω_n + s²/ω_n²) to a ramp. Its first rising edge begins so
 * that 50 % is passed at 0 before the network.
 */
export function trainAt(train: RingingTrain, instant: number): number {
  const { base, top, period, width, riseTime, fallTime, network } = train
  const memory =
    network === null ? 0 : forgotten / (2 * Math.PI * network.naturalFrequency * network.dampingRatio)
  const periods = fewestPeriods + Math.ceil(memory / period)
  const order = Math.floor((instant + riseTime / 2) / period)
  let share = 0
  for (let before = 0; before <= periods; before += 1) {
    const rising = instant - (order - before) * period
    share += edgeShare(network, rising + riseTime / 2, riseTime)
    share -= edgeShare(network, rising - width + fallTime / 2, fallTime)
  }
  return base + (top - base) * share
}

/** How far an edge that began `time` ago has come, 0 to 1 and beyond where it overshoots. */
export function edgeShare(network: RingingNetwork | null, time: number, duration: number): number {
  return (rampShare(network, time) - rampShare(network, time - duration)) / duration
}

function rampShare(network: RingingNetwork | null, time: number): number {
  if (time <= 0) return 0
  if (network === null) return time
  const { naturalFrequency, dampingRatio: zeta } = network
  const natural = 2 * Math.PI * naturalFrequency
  const decay = zeta * natural * time
  const lag = (2 * zeta) / natural
  if (decay > forgotten) return time - lag
  const damped = natural * Math.sqrt(1 - zeta ** 2)
  const swing = lag * Math.cos(damped * time) + ((2 * zeta ** 2 - 1) / damped) * Math.sin(damped * time)
  return time - lag + Math.exp(-decay) * swing
}

/** Samples of a waveform with noise, rounded to the steps of a converter. The same seed gives the same record. */
export function sampled(waveform: (instant: number) => number, sampling: Sampling): Float64Array {
  const { start, interval, count, noise, step, seed } = sampling
  const random = randomSource(seed)
  const values = new Float64Array(count)
  for (let index = 0; index < count; index += 1) {
    const value = waveform(start + index * interval) + noise * random.normal()
    values[index] = step > 0 ? Math.round(value / step) * step : value
  }
  return values
}

/** A train, looked up in one finely sampled period where its period is a whole number of samples. */
export function sampledTrain(train: RingingTrain, sampling: Sampling): Float64Array {
  const perPeriod = Math.round(train.period / sampling.interval)
  const isWhole = Math.abs(perPeriod * sampling.interval - train.period) < 1e-12 * train.period
  if (!isWhole) return sampled((instant) => trainAt(train, instant), sampling)
  const one = Float64Array.from({ length: perPeriod }, (_, index) =>
    trainAt(train, sampling.start + index * sampling.interval),
  )
  const indexOf = (instant: number) => Math.round((instant - sampling.start) / sampling.interval) % perPeriod
  return sampled((instant) => one[indexOf(instant)] ?? 0, sampling)
}

/** Delimited text of a record, as an instrument exports it: time in seconds and volts. */
export function captureText(values: Float64Array, { start, interval }: Sampling): Uint8Array {
  const encoder = new TextEncoder()
  const bytes = new Uint8Array(32 * values.length + 64)
  let end = encoder.encodeInto('time [s],voltage [V]\n', bytes).written
  for (let index = 0; index < values.length; index += 1) {
    const row = `${(start + index * interval).toExponential(10)},${(values[index] ?? 0).toFixed(5)}\n`
    end += encoder.encodeInto(row, bytes.subarray(end)).written
  }
  return bytes.subarray(0, end)
}
