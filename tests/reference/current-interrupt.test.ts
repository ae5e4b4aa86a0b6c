import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { interruptOptimum, interruptPeak } from '@/lib/core/snubber/current-interrupt'

import { ngspiceVersion, transientBy } from '../support/ngspice'

// Source: numeric optimum of the same circuit by ODE integration; chi = 1 as remembered from McMurray 1972 (from memory).
describe('the optimum for an interrupted current', () => {
  it.each([
    [0.2, 2.5459, 1.0358],
    [0.3, 1.7316, 1.0746],
    [0.5, 1.0957, 1.1773],
    [0.7, 0.8335, 1.3005],
    [1, 0.645, 1.5062],
    [1.5, 0.5062, 1.876],
    [2, 0.4405, 2.261],
    [3, 0.3779, 3.0494],
    [5, 0.3305, 4.6511],
  ])('at χ = %d has ζ = %d and a peak of %d E', (chi, zeta, peak) => {
    const optimum = interruptOptimum({ source: 1, inductance: 1, current: chi, snubberCapacitance: 1 })
    expect(optimum.dampingRatio / zeta).toBeCloseTo(1, 2)
    expect(optimum.peakVoltage).toBeCloseTo(peak, 4)
  })

  it('is no worse than any other resistor', () => {
    const factor = fc.double({ min: 0.05, max: 20, noNaN: true })
    fc.assert(
      fc.property(factor, fc.double({ min: 0.02, max: 50, noNaN: true }), (chi, zeta) => {
        const { peakVoltage } = interruptOptimum({
          source: 1,
          inductance: 1,
          current: chi,
          snubberCapacitance: 1,
        })
        expect(peakVoltage).toBeLessThanOrEqual(interruptPeak(chi, zeta) + 1e-6)
      }),
    )
  })

  // Derived: for a small current the voltage starts at E, RI = E, and the peak exceeds it by χ²; for a large one ζ tends
  // to 0.265 and the peak to 0.81 IZ, the least first swing of the network.
  it('is well determined for small and for large currents', () => {
    const small = interruptOptimum({ source: 1, inductance: 1, current: 1e-4, snubberCapacitance: 1 })
    expect(small.dampingRatio * 2e-4).toBeCloseTo(1, 6)
    expect((small.peakVoltage - 1) / 1e-8).toBeCloseTo(1, 3)
    const large = interruptOptimum({ source: 1, inductance: 1, current: 1e4, snubberCapacitance: 1 })
    expect(large.dampingRatio).toBeCloseTo(0.265, 3)
    expect(large.peakVoltage / 1e4).toBeCloseTo(0.81, 3)
  })

  it('passes smoothly through critical damping', () => {
    const [below, at, above] = [1 - 1e-7, 1, 1 + 1e-7].map((zeta) => interruptPeak(0.4, zeta))
    expect(below).toBeCloseTo(at ?? 0, 6)
    expect(above).toBeCloseTo(at ?? 0, 6)
  })
})

const circuit = { source: 48, inductance: 60e-9, current: 10, snubberCapacitance: 2.2e-9 }

function peakBySimulation(resistance: number): number {
  const transient = transientBy({
    circuit: [
      'A current interrupted in an inductance',
      `V1 source 0 ${circuit.source}`,
      `L1 source switch ${circuit.inductance} ic=${circuit.current}`,
      `R1 switch a ${resistance}`,
      `C1 a 0 ${circuit.snubberCapacitance} ic=0`,
    ],
    reltol: '1e-7',
    analysis: 'tran 10p 200n 0 10p uic',
    node: 'switch',
  })
  // The first instants are the simulator's start from its initial conditions.
  return Math.max(...transient.slice(2).map(([, voltage]) => voltage))
}

// Source: a transient analysis by ngspice, a circuit simulator of its own.
describe.skipIf(ngspiceVersion === undefined)(
  ngspiceVersion === undefined
    ? 'the peak against ngspice (skipped: not installed)'
    : `the peak against ${ngspiceVersion}`,
  () => {
    it.each([0.5, 1, 2])('agrees within 0.1 % at %d times the optimal resistor', (factor) => {
      const optimum = interruptOptimum(circuit)
      const exact = circuit.source * interruptPeak(optimum.currentFactor, factor * optimum.dampingRatio)
      expect(peakBySimulation(factor * optimum.resistance) / exact).toBeCloseTo(1, 3)
    })
  },
)
