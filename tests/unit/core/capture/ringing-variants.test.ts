import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { analyseCapture } from '@/lib/core/capture/analyse-capture'
import type { TwoStates } from '@/lib/core/capture/capture-analysis'

import {
  edgeShare,
  sampled,
  sampledTrain,
  type RingingTrain,
} from '../../../../lib/commands/benches/ringing-train'
import { edgeTruth, harmonicTruth } from '../../../fixtures/ringing-truth'

const options = { seed: 20261201, numRuns: 60 }

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true })

/** Evenly over the decades between two values. */
const decades = (min: number, max: number) => within(Math.log(min), Math.log(max)).map(Math.exp)

function statesOf(values: Float64Array, start: number, interval: number): TwoStates {
  const result = analyseCapture(values, start, interval)
  if (!result.ok || result.value.states === null) throw new Error('no states')
  return result.value.states
}

const off = (got: number | undefined, expected: number): number =>
  got === undefined ? Infinity : Math.abs(got / expected - 1)

const steps = fc.record({
  frequency: decades(1e6, 400e6),
  dampingRatio: decades(0.005, 0.1),
  /** Of the edge, in periods of the ring. */
  edge: within(0.15, 0.6),
  samplesPerCycle: decades(12, 100),
  height: fc.oneof(
    decades(0.5, 400),
    decades(0.5, 400).map((height) => -height),
  ),
  /** In heights. */
  base: fc.constantFrom(0, 0, -1.3, 0.7),
  timeConstants: within(4, 9),
  phase: within(0, 1),
  noise: fc.constantFrom(0, 1 / 600, 1 / 300),
  bits: fc.constantFrom(0, 2.2 / 256, 2.7 / 256),
  seed: fc.integer({ min: 1, max: 1e6 }),
})

type Step = typeof steps extends fc.Arbitrary<infer Value> ? Value : never

function recordOf(step: Step) {
  const network = { naturalFrequency: step.frequency, dampingRatio: step.dampingRatio }
  const interval = 1 / step.frequency / step.samplesPerCycle
  const decay = 1 / (2 * Math.PI * step.frequency * step.dampingRatio)
  const after = Math.min(120_000, Math.round((step.timeConstants * decay) / interval) + 200)
  const before = Math.round(after / 4) + 50
  const duration = step.edge / step.frequency
  const base = step.base * step.height
  const start = -(before + step.phase) * interval
  const values = sampled((time) => base + step.height * edgeShare(network, time, duration), {
    start,
    interval,
    count: before + after,
    noise: step.noise * Math.abs(step.height),
    step: step.bits * Math.abs(step.height),
    seed: step.seed,
  })
  return { values, start, interval, base, truth: edgeTruth(network, duration) }
}

describe('edges behind a second-order network, against its exact response (textbook theory)', () => {
  it('measures frequency, damping, transition, overshoot and levels of any of them', () => {
    fc.assert(
      fc.property(steps, (step) => {
        const { values, start, interval, base, truth } = recordOf(step)
        const states = statesOf(values, start, interval)
        const transition = step.height > 0 ? states.riseTime : states.fallTime
        const size = Math.abs(step.height)
        expect(states.kind).toBe('step')
        expect(off(states.ring?.dampedFrequency.value, truth.ringFrequency)).toBeLessThan(0.01)
        expect(off(states.ring?.dampingRatio.value, truth.dampingRatio)).toBeLessThan(0.1)
        expect(Math.abs((transition?.median ?? 0) - truth.transition)).toBeLessThan(
          Math.max(0.05 * truth.transition, 0.2 * interval),
        )
        expect(Math.abs(states.overshoot.fraction - truth.overshoot)).toBeLessThan(0.03)
        expect(states.overshoot.isLowerBound).toBe(false)
        expect(Math.abs(states.base - base)).toBeLessThan(0.015 * size)
        expect(Math.abs(states.top - base - step.height)).toBeLessThan(0.015 * size)
      }),
      options,
    )
  })

  it('bounds the overshoot of a cut-off ring, and rebuilds its first peak from the ring after', () => {
    const clipped = fc.record({ step: steps, part: within(0.4, 0.85) })
    fc.assert(
      fc.property(clipped, ({ step, part }) => {
        const bits = step.bits || 2.4 / 256
        const { values, start, interval, base, truth } = recordOf({ ...step, bits })
        const unit = bits * Math.abs(step.height)
        const edge = Math.floor((Math.abs(step.height) * (1 + part * truth.overshoot)) / unit) * unit
        const sign = Math.sign(step.height)
        const limit = Math.round((base + sign * edge) / unit) * unit
        const cut = values.map((value) => (sign * (value - limit) > 0 ? limit : value))
        const states = statesOf(cut, start, interval)
        expect(states.overshoot.isLowerBound).toBe(true)
        expect(Math.abs((states.overshoot.reconstructed ?? 0) - truth.overshoot)).toBeLessThan(0.05)
        expect(off(states.ring?.dampedFrequency.value, truth.ringFrequency)).toBeLessThan(0.01)
        expect(off(states.ring?.dampingRatio.value, truth.dampingRatio)).toBeLessThan(0.1)
      }),
      { ...options, numRuns: 40 },
    )
  })

  it('has intervals that hold the truth about as often as they say', () => {
    let held = 0
    let asked = 0
    fc.assert(
      fc.property(steps, (step) => {
        const { values, start, interval, truth } = recordOf({ ...step, noise: 1 / 300 })
        const frequency = statesOf(values, start, interval).ring?.dampedFrequency
        asked += 1
        if (frequency && frequency.low <= truth.ringFrequency && truth.ringFrequency <= frequency.high)
          held += 1
      }),
      { ...options, numRuns: 80 },
    )
    expect(held / asked).toBeGreaterThan(0.85)
  })
})

const trains = fc.record({
  period: decades(2e-7, 2e-5),
  samplesPerPeriod: decades(2000, 8000),
  periods: within(3, 40),
  duty: within(0.15, 0.85),
  height: decades(0.5, 400),
  base: fc.constantFrom(0, 0, -1, 0.4),
  ring: fc.option(
    fc.record({ dampingRatio: decades(0.02, 0.08), settling: within(7, 14), edge: within(0.2, 0.6) }),
  ),
  /** Of the edges without a ring, in parts of the shorter state. */
  rise: within(0.02, 0.1),
  fall: within(0.02, 0.1),
  noise: fc.constantFrom(1 / 1200, 1 / 400),
  bits: fc.constantFrom(0, 2 / 256),
  seed: fc.integer({ min: 1, max: 1e6 }),
})

type Train = typeof trains extends fc.Arbitrary<infer Value> ? Value : never

function trainOf(item: Train): RingingTrain {
  const shorter = Math.min(item.duty, 1 - item.duty) * item.period
  const naturalFrequency =
    item.ring === null ? 0 : item.ring.settling / (2 * Math.PI * item.ring.dampingRatio * shorter)
  const edge = (part: number) => (item.ring === null ? part * shorter : item.ring.edge / naturalFrequency)
  return {
    base: item.base * item.height,
    top: (item.base + 1) * item.height,
    period: item.period,
    width: item.duty * item.period,
    riseTime: edge(item.rise),
    fallTime: edge(item.fall),
    network: item.ring === null ? null : { naturalFrequency, dampingRatio: item.ring.dampingRatio },
  }
}

describe('pulse trains with and without a ring, against their Fourier series and exact response', () => {
  it('measures period, duty, levels, transitions, ring and harmonics of any of them', () => {
    fc.assert(
      fc.property(trains, (item) => {
        const train = trainOf(item)
        const interval = item.period / item.samplesPerPeriod
        fc.pre(train.network === null || train.network.naturalFrequency * interval < 1 / 8)
        const count = Math.round(item.periods * item.samplesPerPeriod)
        const noise = item.noise * item.height
        const sampling = {
          start: -0.2 * item.period,
          interval,
          count,
          noise,
          step: item.bits * item.height,
          seed: item.seed,
        }
        const states = statesOf(sampledTrain(train, sampling), sampling.start, interval)
        const truth = train.network === null ? null : edgeTruth(train.network, train.riseTime)
        expect(states.kind).toBe('train')
        expect(off(states.period?.seconds, item.period)).toBeLessThan(1e-4)
        expect(Math.abs((states.period?.duty ?? 0) - item.duty)).toBeLessThan(0.002)
        expect(off(states.amplitude, item.height)).toBeLessThan(0.015)
        expectTransition(states.riseTime?.median, truth?.transition ?? 0.8 * train.riseTime, interval)
        expectTransition(states.fallTime?.median, truth?.transition ?? 0.8 * train.fallTime, interval)
        expect(Math.abs(states.overshoot.fraction - (truth?.overshoot ?? 0))).toBeLessThan(0.04)
        expectRing(states, truth)
        expectHarmonics(states, train, 0.25 / interval)
      }),
      options,
    )
  })
})

function expectTransition(got: number | undefined, expected: number, interval: number): void {
  expect(Math.abs((got ?? 0) - expected)).toBeLessThan(Math.max(0.05 * expected, 0.5 * interval))
}

function expectRing({ ring }: TwoStates, truth: ReturnType<typeof edgeTruth> | null): void {
  if (truth === null) return expect(ring).toBeNull()
  expect(off(ring?.dampedFrequency.value, truth.ringFrequency)).toBeLessThan(0.01)
  expect(off(ring?.dampingRatio.value, truth.dampingRatio)).toBeLessThan(0.15)
}

/** Those within 30 dB of the first one, as far as a quarter of the sample rate. */
function expectHarmonics({ harmonics }: TwoStates, train: RingingTrain, highest: number): void {
  const least = harmonicTruth(train, 1) * 10 ** (-30 / 20)
  for (const { order, frequency, amplitude, level } of harmonics?.list ?? []) {
    if (frequency > highest) break
    const expected = harmonicTruth(train, order)
    if (expected < least) continue
    expect(level).not.toBeNull()
    expect(Math.abs(20 * Math.log10(amplitude / expected))).toBeLessThan(0.5)
  }
}
