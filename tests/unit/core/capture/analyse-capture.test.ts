import { describe, expect, it } from 'vitest'

import { analyseCapture } from '@/lib/core/capture/analyse-capture'
import type { CaptureAnalysis, TwoStates } from '@/lib/core/capture/capture-analysis'
import { randomSource } from '@/lib/core/uncertainty/random'

import { sampled, sampledTrain, type RingingTrain } from '../../../../lib/commands/benches/ringing-train'

const ns = 1e-9

function analysed(values: Float64Array, interval = ns): CaptureAnalysis {
  const result = analyseCapture(values, 0, interval)
  if (!result.ok) throw new Error(result.error.message)
  return result.value
}

function statesOf(values: Float64Array, interval = ns): TwoStates {
  const { states } = analysed(values, interval)
  if (states === null) throw new Error('no states')
  return states
}

const trapezoid: RingingTrain = {
  base: -1,
  top: 4,
  period: 1000 * ns,
  width: 300 * ns,
  riseTime: 20 * ns,
  fallTime: 40 * ns,
  network: null,
}

const plain = { start: -100 * ns, interval: ns, count: 20_000, noise: 0, step: 0, seed: 1 }

describe('a trapezoid of 5 V, 1 µs, 300 ns, edges of 20 and 40 ns', () => {
  const states = statesOf(sampledTrain(trapezoid, plain))

  it('has the transitions 0.8 t_r and 0.8 t_f, by definition of a linear edge', () => {
    expect(states.riseTime?.median).toBeCloseTo(16 * ns, 11)
    expect(states.fallTime?.median).toBeCloseTo(32 * ns, 11)
    expect(states).toMatchObject({ kind: 'train', risingEdges: 20, fallingEdges: 20 })
  })

  it('has its levels, period and duty', () => {
    expect(states.base).toBeCloseTo(-1, 9)
    expect(states.top).toBeCloseTo(4, 9)
    expect(states.period?.seconds).toBeCloseTo(1000 * ns, 14)
    expect(states.period?.duty).toBeCloseTo(0.3, 6)
    expect(states.period?.jitterSeconds).toBeLessThan(1e-3 * ns)
  })

  it('has the harmonics of its Fourier series: 2|c₁| = (A/π)|sinc(t_r/T) − sinc(t_f/T) e^(−j2πτ/T)|', () => {
    const [first] = states.harmonics?.list ?? []
    // A = 5 V: sinc(0.02) = 0.99934, sinc(0.04) = 0.99737, angle 2π·0.3.
    const expected =
      (5 / Math.PI) *
      Math.hypot(0.99934 - 0.99737 * Math.cos(0.6 * Math.PI), 0.99737 * Math.sin(0.6 * Math.PI))
    expect(first?.amplitude).toBeCloseTo(expected, 4)
    expect(first?.frequency).toBeCloseTo(1e6, 2)
  })

  it('has no overshoot and no ring, and says why', () => {
    expect(states.overshoot).toMatchObject({ fraction: 0, isLowerBound: false, reconstructed: null })
    expect(states.ring).toBeNull()
    expect(states.ringAbsence).toBe('No oscillation stands above the noise after the edge.')
  })

  it('finds the same in volts and in millivolts, up or down in level', () => {
    const values = sampledTrain(trapezoid, plain)
    const moved = statesOf(values.map((value) => 1000 * value - 7000))
    expect(moved.base).toBeCloseTo(-8000, 6)
    expect(moved.riseTime?.median).toBeCloseTo(states.riseTime?.median ?? 0, 15)
    expect(moved.period).toEqual({
      ...states.period,
      seconds: expect.closeTo(states.period?.seconds ?? 0, 14),
      fundamental: expect.closeTo(1e6, 3),
      duty: expect.closeTo(0.3, 6),
      jitterSeconds: expect.any(Number),
    })
  })
})

describe('what makes a record a step, pulses or a train', () => {
  const edgesAt = (...instants: readonly number[]) =>
    sampled((time) => instants.filter((instant) => time >= instant).length % 2, {
      ...plain,
      start: 0,
      count: 4000,
      noise: 0.002,
    })

  it('is a step with one edge, whose base is the level before it', () => {
    const falling = statesOf(edgesAt(1000 * ns).map((value) => 1 - value))
    expect(falling).toMatchObject({ kind: 'step', direction: 'falling', period: null, harmonics: null })
    expect(falling.base).toBeCloseTo(1, 3)
    expect(falling.top).toBeCloseTo(0, 3)
  })

  it('is a pulse with two edges', () => {
    expect(statesOf(edgesAt(1000 * ns, 1300 * ns))).toMatchObject({ kind: 'pulses', period: null })
  })

  it('is a train when two intervals between like edges agree, and pulses when they do not', () => {
    expect(statesOf(edgesAt(500 * ns, 800 * ns, 1500 * ns, 1800 * ns)).kind).toBe('train')
    expect(statesOf(edgesAt(500 * ns, 800 * ns, 1500 * ns, 2800 * ns)).kind).toBe('pulses')
  })
})

describe('records that rest at no two levels', () => {
  it('finds neither states nor sines in a constant or in noise', () => {
    const random = randomSource(3)
    expect(analysed(new Float64Array(1000).fill(12))).toMatchObject({ states: null, tones: null })
    const noise = analysed(Float64Array.from({ length: 20_000 }, () => 12 + 0.05 * random.normal()))
    expect(noise.states).toBeNull()
    expect(noise.deviation).toBeCloseTo(0.05, 2)
  })

  it('finds the one sine of a sine, with 0.5 V as 110.97 dBµV', () => {
    const sine = Float64Array.from(
      { length: 10_000 },
      (_, index) => 2 + 0.5 * Math.sin(0.02 * Math.PI * 1.037 * index),
    )
    const { states, tones } = analysed(sine)
    expect(states).toBeNull()
    expect(tones?.list).toHaveLength(1)
    expect(tones?.list[0]?.frequency).toBeCloseTo(10.37e6, 0)
    expect(tones?.list[0]?.level).toBeCloseTo(20 * Math.log10(0.5 / Math.SQRT2 / 1e-6), 3)
  })
})

describe('what analyseCapture refuses', () => {
  it.each([
    ['fewer than 32 samples', new Float64Array(31), ns, 'too_few_samples'],
    ['an interval of 0', new Float64Array(100), 0, 'interval_not_positive'],
    ['an infinite interval', new Float64Array(100), Infinity, 'interval_not_positive'],
    ['a value that is not finite', new Float64Array(100).fill(NaN, 40, 41), ns, 'value_not_finite'],
  ])('refuses %s with a sentence', (_, values, interval, code) => {
    const result = analyseCapture(values, 0, interval)
    expect(result).toMatchObject({
      ok: false,
      error: { code, message: expect.stringMatching(/^\p{Lu}.*\.$/u) },
    })
  })
})
