import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { analyseCapture } from '@/lib/core/capture/analyse-capture'

import { sampled } from '../../../../lib/commands/benches/ringing-train'
import { polesOf, stepResponseAt, type SnubbedPoles } from '../../../fixtures/snubbed-response'

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true })

const nodes = fc.record({
  capacitanceRatio: within(0.6, 4),
  resistanceRatio: within(0.8, 2.4),
  samplesPerCycle: within(25, 90),
  phase: within(0, 1),
  seed: fc.integer({ min: 1, max: 1e6 }),
})

const dampingOf = ({ decay, damped }: SnubbedPoles): number => decay / Math.hypot(decay, damped)

/** ω₀ of the node without its snubber. */
const natural = 2 * Math.PI * 80e6

describe('the ring of a snubbed node against the pole pair of its network (residues of the exact step response)', () => {
  it('has the frequency and damping of the pair, though it rides on the exponential of the third pole', () => {
    fc.assert(
      fc.property(nodes, (item) => {
        const poles = polesOf(item)
        if (poles === null || dampingOf(poles) > 0.33) return fc.pre(false)
        const interval = (2 * Math.PI) / natural / item.samplesPerCycle
        const settled = 12 / Math.min(poles.axis, poles.decay) / natural / interval
        const values = sampled((time) => 12 * stepResponseAt(item, poles, natural * time), {
          start: -(300 + item.phase) * interval,
          interval,
          count: 500 + Math.round(settled),
          noise: 0.02,
          step: 0.09375,
          seed: item.seed,
        })
        const result = analyseCapture(values, 0, interval)
        const ring = result.ok ? result.value.states?.ring : null
        expect(
          Math.abs((ring?.dampedFrequency.value ?? 0) / ((poles.damped * natural) / 2 / Math.PI) - 1),
        ).toBeLessThan(0.015)
        expect(Math.abs((ring?.dampingRatio.value ?? 0) / dampingOf(poles) - 1)).toBeLessThan(0.1)
      }),
      { seed: 20261201, numRuns: 80 },
    )
  })
})
