import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { edgeResponse, valueOf } from '@/lib/core/snubber/edge-response'
import { normalise, type SwitchNode } from '@/lib/core/snubber/network'
import { nodeVoltageAt, switchEdge } from '@/lib/core/snubber/switched-edge'

// L = 1 H and Cpar = 1 F: ω0 = 1 rad/s and Z0 = 1 Ω.
const bare = (seriesResistance: number): SwitchNode => ({ inductance: 1, capacitance: 1, seriesResistance })
const snubbed = (k: number, rho: number, r = 0): SwitchNode => ({
  ...bare(r),
  snubber: { resistance: rho, capacitance: k },
})
const unitStep = { from: 0, step: 1, duration: 0 }

const logarithmic = (low: number, high: number) =>
  fc.double({ noNaN: true, min: Math.log(low), max: Math.log(high) }).map(Math.exp)
const anyNode = fc
  .record({ k: logarithmic(0.01, 100), rho: logarithmic(0.001, 1000), r: logarithmic(0.001, 10) })
  .map(({ k, rho, r }) => snubbed(k, rho, r))

describe('one edge at the switch node', () => {
  it('overshoots by all of the step where nothing damps', () => {
    const { peak, overshoot, ringFrequency } = switchEdge(bare(0), { from: -2, step: 12, duration: 0 })
    expect(overshoot).toBeCloseTo(1, 10)
    expect(peak).toBeCloseTo(22, 9)
    expect(ringFrequency).toBeCloseTo(1 / (2 * Math.PI), 12)
  })

  it('does not overshoot where a lossless ring is driven for whole periods', () => {
    expect(switchEdge(bare(0), { ...unitStep, duration: 4 * Math.PI }).overshoot).toBeLessThan(1e-9)
    // Half as long again: |sinc(f0 tr)| of the step.
    const overshoot = switchEdge(bare(0), { ...unitStep, duration: 3 * Math.PI }).overshoot
    expect(overshoot).toBeCloseTo(2 / (3 * Math.PI), 9)
  })

  it('is exact where poles coincide: critical damping', () => {
    const times = [0.5, 1, 3, 10]
    const exact = times.map((time) => 1 - (1 + time) * Math.exp(-time))
    for (const [index, value] of nodeVoltageAt(bare(2), unitStep, times).entries()) {
      expect(value).toBeCloseTo(exact[index] ?? NaN, 7)
    }
    expect(switchEdge(bare(2), unitStep).overshoot).toBeLessThan(1e-7)
  })

  it('is continuous across the triple pole at k = 8', () => {
    const rho = 9 ** 0.75 / 8
    const at = (factor: number) => switchEdge(snubbed(8, rho * factor), unitStep)
    expect(at(1).dampingRatio).toBeCloseTo(1, 3)
    expect(Math.abs(at(1).overshoot - (at(0.999).overshoot + at(1.001).overshoot) / 2)).toBeLessThan(1e-5)
  })

  it('turns ½ (Cs + Cpar) V² into heat, whatever the resistances', () => {
    fc.assert(
      fc.property(anyNode, logarithmic(0.1, 100), (node, step) => {
        const { snubberEnergy, seriesEnergy } = switchEdge(node, { from: 0, step, duration: 0 })
        const expected = 0.5 * (1 + (node.snubber?.capacitance ?? 0)) * step ** 2
        expect((snubberEnergy + seriesEnergy) / expected).toBeCloseTo(1, 4)
      }),
    )
  })

  it('finds the peak that a dense search finds, for poles near and far apart', () => {
    const duration = fc.oneof(fc.constant(0), logarithmic(0.01, 50))
    fc.assert(
      fc.property(anyNode, duration, (node, edge) => {
        const { overshoot } = switchEdge(node, { ...unitStep, duration: edge })
        const times = Array.from({ length: 20_000 }, (_, index) => (index / 20_000) * (edge + 200))
        const highest = Math.max(...nodeVoltageAt(node, { ...unitStep, duration: edge }, times))
        expect(overshoot).toBeGreaterThan(highest - 1 - 1e-6)
        expect(overshoot).toBeLessThan(Math.max(0, highest - 1) + 1e-3)
      }),
      { numRuns: 200 },
    )
  })

  it('finds the largest current on a long edge and after a short one', () => {
    const duration = fc.oneof(logarithmic(0.05, 2), logarithmic(2, 100))
    const ringing = fc
      .record({ k: logarithmic(0.1, 30), rho: logarithmic(0.01, 10), r: logarithmic(0.01, 3) })
      .map(({ k, rho, r }) => snubbed(k, rho, r))
    fc.assert(
      fc.property(ringing, duration, (node, edge) => {
        const { snubberPeakCurrent } = switchEdge(node, { ...unitStep, duration: edge })
        const [interval, span] = [(edge + 60) / 60_000, edge + 60]
        const times = Array.from({ length: 60_000 }, (_, index) => (index / 60_000) * span)
        const network = normalise(node)
        const response = edgeResponse(network.snubberCurrent, network.denominator, edge)
        const largest = Math.max(...times.map((time) => Math.abs(valueOf(response, time))))
        expect(snubberPeakCurrent).toBeGreaterThan(largest * (1 - 1e-6))
        // No current changes faster than the step that drives it through the inductance.
        expect(snubberPeakCurrent).toBeLessThan(largest + interval)
      }),
      { numRuns: 60 },
    )
  })

  // Found by a dense search: the crest comes early, while the pair of poles has a cycle of 140.
  it('finds an early crest where the poles are nearly real', () => {
    const outcome = switchEdge(snubbed(11.609051563829144, 0.5540458, 0.0016316), unitStep)
    const times = Array.from({ length: 100_000 }, (_, index) => index / 5000)
    const highest = Math.max(
      ...nodeVoltageAt(snubbed(11.609051563829144, 0.5540458, 0.0016316), unitStep, times),
    )
    expect(outcome.overshoot).toBeCloseTo(highest - 1, 6)
  })

  it('is the same for every inductance and capacitance of one ratio, in its own time and impedance', () => {
    fc.assert(
      fc.property(anyNode, logarithmic(1e-10, 1e-6), logarithmic(1e-12, 1e-8), (node, l, c) => {
        const [z0, omega] = [Math.sqrt(l / c), 1 / Math.sqrt(l * c)]
        const { resistance = 0, capacitance = 0 } = node.snubber ?? {}
        const scaled: SwitchNode = {
          inductance: l,
          capacitance: c,
          seriesResistance: node.seriesResistance * z0,
          snubber: { resistance: resistance * z0, capacitance: capacitance * c },
        }
        // Where poles coincide they are moved apart: so far the digits may differ.
        const one = switchEdge(node, { ...unitStep, duration: 0.7 })
        const other = switchEdge(scaled, { ...unitStep, duration: 0.7 / omega })
        expect(other.overshoot).toBeCloseTo(one.overshoot, 5)
        expect(other.dampingRatio).toBeCloseTo(one.dampingRatio, 4)
        expect(other.snubberPeakCurrent * z0).toBeCloseTo(one.snubberPeakCurrent, 5)
        expect(other.snubberEnergy / c / one.snubberEnergy).toBeCloseTo(1, 3)
      }),
    )
  })
})
