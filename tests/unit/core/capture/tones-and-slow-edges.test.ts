import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { analyseCapture } from '@/lib/core/capture/analyse-capture'

import { sampled } from '../../../../lib/commands/benches/ringing-train'

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const decades = (min: number, max: number) => within(Math.log(min), Math.log(max)).map(Math.exp)

const count = 32_768
const rate = 100e6

const sums = fc.record({
  // In bins, far enough from each other to be told apart.
  places: fc.uniqueArray(fc.integer({ min: 5, max: 100 }), { minLength: 1, maxLength: 6 }),
  amplitudes: fc.array(decades(0.02, 1), { minLength: 6, maxLength: 6 }),
  phases: fc.array(within(0, 6), { minLength: 6, maxLength: 6 }),
  fraction: within(0, 1),
  noise: decades(1e-4, 5e-3),
  step: fc.constantFrom(0, 0.005),
})

describe('sums of sines', () => {
  it('finds every sine within 10⁻⁴ and 0.5 dB, and no edges', () => {
    fc.assert(
      fc.property(sums, ({ places, amplitudes, phases, fraction, noise, step }) => {
        const sines = places.map((place, index) => ({
          frequency: ((150 * place + 20 * index + fraction) * rate) / count,
          amplitude: amplitudes[index] ?? 0,
          phase: phases[index] ?? 0,
        }))
        const waveform = (time: number) =>
          sines.reduce(
            (sum, s) => sum + s.amplitude * Math.cos(2 * Math.PI * s.frequency * time + s.phase),
            0.3,
          )
        const values = sampled(waveform, { start: 0, interval: 1 / rate, count, noise, step, seed: 5 })
        const result = analyseCapture(values, 0, 1 / rate)
        if (!result.ok) throw new Error(result.error.message)
        expect(result.value.states).toBeNull()
        for (const { frequency, amplitude } of sines) {
          const tone = result.value.tones?.list.find(
            (found) => Math.abs(found.frequency / frequency - 1) < 1e-4,
          )
          expect(Math.abs(20 * Math.log10((tone?.amplitude ?? 0) / amplitude))).toBeLessThan(0.5)
        }
      }),
      { seed: 20261201, numRuns: 50 },
    )
  })
})

const slowEdges = fc.record({
  timeConstant: decades(1e-9, 1e-6),
  samples: decades(8, 100),
  height: fc.oneof(
    decades(0.3, 300),
    decades(0.3, 300).map((height) => -height),
  ),
  before: within(12, 40),
  after: within(10, 50),
  phase: within(0, 1),
  noise: fc.constantFrom(1e-3, 2e-3),
  bits: fc.constantFrom(0, 1 / 140, 1 / 220),
  seed: fc.integer({ min: 1, max: 1e6 }),
})

describe('first-order edges', () => {
  it('takes τ ln 9 from 10 to 90 %, does not overshoot, and is given no ring', () => {
    fc.assert(
      fc.property(slowEdges, (item) => {
        const { timeConstant, height } = item
        const interval = timeConstant / item.samples
        const before = Math.round(item.before * item.samples)
        const values = sampled((time) => (time < 0 ? 0 : -height * Math.expm1(-time / timeConstant)), {
          start: -(before + item.phase) * interval,
          interval,
          count: before + Math.round(item.after * item.samples),
          noise: item.noise * Math.abs(height),
          step: item.bits * Math.abs(height),
          seed: item.seed,
        })
        const result = analyseCapture(values, 0, interval)
        const states = result.ok ? result.value.states : null
        const transition = height > 0 ? states?.riseTime : states?.fallTime
        expect(states?.kind).toBe('step')
        expect(states?.ring).toBeNull()
        expect(states?.ringAbsence).toMatch(/\.$/u)
        expect(states?.overshoot.fraction).toBeLessThan(0.02)
        const expected = timeConstant * Math.log(9)
        expect(Math.abs((transition?.median ?? 0) / expected - 1)).toBeLessThan(0.03)
      }),
      { seed: 20261201, numRuns: 60 },
    )
  })
})

describe('any record at all', () => {
  it('is answered without NaN or infinity, or refused with a sentence', () => {
    const records = fc.array(fc.oneof(within(-1e6, 1e6), fc.constantFrom(0, 1, -1)), {
      minLength: 1,
      maxLength: 400,
    })
    fc.assert(
      fc.property(records, decades(1e-12, 1), (values, interval) => {
        const result = analyseCapture(Float64Array.from(values), 0, interval)
        const text = JSON.stringify(result, (_, value) =>
          typeof value === 'number' && !Number.isFinite(value) ? 'not finite' : value,
        )
        expect(text).not.toContain('not finite')
      }),
      { seed: 20261201, numRuns: 400 },
    )
  })
})
