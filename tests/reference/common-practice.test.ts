import { describe, expect, it } from 'vitest'

import { mixingProducts } from '@/lib/core/spectrum/intermodulation'
import { envelopeOf, harmonicPeak, type PulseTrain } from '@/lib/core/spectrum/pulse-train'

/** Facts that every engineer of the trade uses and that nobody owns. */
describe('common practice, no source', () => {
  it('an edge of 2 ns reaches 500 MHz by 1/t, an upper bound; 175 MHz by 0.35/t, 159 MHz by 1/(πt)', () => {
    const edge = 2e-9
    const train: PulseTrain = { amplitude: 5, period: 100e-9, width: 40e-9, rise: edge, fall: edge }
    expect(1 / edge).toBeCloseTo(500e6, 0)
    expect(0.35 / edge).toBeCloseTo(175e6, 0)
    expect(envelopeOf(train).secondCorner).toBeCloseTo(159.15e6, -5)
    // 1/t is the first null of the factor that the edge puts on the spectrum: nothing worth counting lies above it.
    const strongest = Array.from({ length: 50 }, (_, index) => harmonicPeak(train, 51 + index))
    const share = strongest.reduce((sum, peak) => sum + peak ** 2, 0)
    const all = Array.from({ length: 400 }, (_, index) => harmonicPeak(train, 1 + index) ** 2)
    expect(share / all.reduce((sum, power) => sum + power, 0)).toBeLessThan(0.001)
  })

  it('a square wave of 500 kHz with equal edges has 1.5, 2.5, 3.5 MHz and no even harmonic', () => {
    const square: PulseTrain = { amplitude: 12, period: 2e-6, width: 1e-6, rise: 20e-9, fall: 20e-9 }
    for (let n = 1; n <= 15; n += 1) {
      const peak = harmonicPeak(square, n)
      if (n % 2 === 1) expect(peak).toBeGreaterThan(0.01)
      else expect(peak).toBeLessThan(1e-12)
    }
    expect([3, 5, 7].map((n) => (n * 500e3) / 1e6)).toEqual([1.5, 2.5, 3.5])
  })

  it('with unequal edges its even harmonics are there', () => {
    const square: PulseTrain = { amplitude: 12, period: 2e-6, width: 1e-6, rise: 10e-9, fall: 30e-9 }
    expect(harmonicPeak(square, 2)).toBeGreaterThan(1e-3)
  })

  it('two clocks that meet in something not linear make their sum and their difference', () => {
    const second = mixingProducts(24e6, 25e6, 2, 0, 100e6).filter(
      ({ order, m, n }) => order === 2 && m * n !== 0,
    )
    expect(second.map(({ frequency }) => frequency)).toEqual([1e6, 49e6])
  })
})
