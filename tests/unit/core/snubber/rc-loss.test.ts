import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { settledEdgeLoss, squareWaveLoss } from '@/lib/core/snubber/rc-loss'

const logarithmic = (low: number, high: number) =>
  fc.double({ noNaN: true, min: Math.log(low), max: Math.log(high) }).map(Math.exp)

describe('the loss of R and C on a square wave', () => {
  it('tends to C V² f where every half settles', () => {
    fc.assert(
      fc.property(logarithmic(1e-3, 1e3), logarithmic(1e-12, 1e-6), logarithmic(1, 1e3), (r, c, v) => {
        const frequency = 1 / (200 * r * c)
        expect(squareWaveLoss(r, c, v, frequency).power / (c * v ** 2 * frequency)).toBeCloseTo(1, 9)
      }),
    )
  })

  // By hand: half a period of one time constant, tanh(1/2) = 0.46212.
  it('is C V² f tanh(T/4RC) for a duty cycle of one half', () => {
    expect(squareWaveLoss(1, 1, 1, 0.5).power).toBeCloseTo(0.5 * 0.4621171573, 9)
  })

  it('never exceeds C V² f, nor what the ripple-free current of R alone would burn', () => {
    fc.assert(
      fc.property(logarithmic(1e-6, 1e6), fc.double({ min: 0.01, max: 0.99, noNaN: true }), (f, duty) => {
        const { power, peakCurrent } = squareWaveLoss(1, 1, 1, f, duty)
        expect(power).toBeLessThanOrEqual(f * (1 + 1e-12))
        expect(power).toBeLessThanOrEqual(duty * (1 - duty) * (1 + 1e-9))
        expect(peakCurrent).toBeLessThanOrEqual(1 + 1e-12)
      }),
    )
  })
})

describe('the loss of R and C on settled edges', () => {
  it('tends to ½ C V² an edge for short edges, without losing digits', () => {
    for (const edge of [1e-3, 1e-6, 1e-9, 1e-15]) {
      const { power, peakCurrent } = settledEdgeLoss(2, 3, 5, 0.5, edge)
      // The first term of the series, 1 − t/(3RC).
      expect(power / (0.5 * 3 * 25)).toBeCloseTo(1 - edge / 18, 6)
      expect(peakCurrent).toBeCloseTo(2.5, 3)
    }
  })

  it('tends to C V² RC/t for long ones', () => {
    expect(settledEdgeLoss(1, 1, 1, 0.5, 1e4).power).toBeCloseTo(1e-4, 7)
  })

  it('has no seam where the series begins', () => {
    const [below, above] = [0.1 - 1e-12, 0.1 + 1e-12].map((edge) => settledEdgeLoss(1, 1, 1, 1, edge).power)
    expect((below ?? 0) / (above ?? 1)).toBeCloseTo(1, 11)
  })
})
