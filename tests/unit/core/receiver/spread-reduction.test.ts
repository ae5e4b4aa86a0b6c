import { describe, expect, it } from 'vitest'

import { receiverBands } from '@/lib/core/receiver/bands'
import { coupledStagesBandwidths } from '@/lib/core/receiver/filter-bandwidths'
import { isWithinReach, spreadReduction } from '@/lib/core/receiver/spread-reduction'
import { carsonWidth, evenSpreadReduction, sidebandsOf } from '@/lib/core/spectrum/spread-spectrum'

const { C, E } = receiverBands

const line = (width: number, rate: number) => ({ width, rate, profile: 'triangle' }) as const

/** Bessel function of the first kind by its integral. */
function bessel(n: number, x: number): number {
  const steps = 2000
  let sum = 0
  for (let k = 0; k < steps; k += 1) {
    const t = (Math.PI * (k + 0.5)) / steps
    sum += Math.cos(n * t - x * Math.sin(t)) / steps
  }
  return sum
}

describe('the sidebands of a swept line', () => {
  // Source: the Bessel spectrum of frequency modulation, any textbook of communications (from memory).
  it('are Bessel functions of the modulation index for a sine', () => {
    const { lines, count } = sidebandsOf({ width: 500e3, rate: 50e3, profile: 'sine' })
    for (let n = 0; n <= 8; n += 1) {
      const at = 2 * (count + n)
      expect(Math.hypot(lines[at] ?? 0, lines[at + 1] ?? 0)).toBeCloseTo(Math.abs(bessel(n, 5)), 6)
    }
  })

  it.each(['triangle', 'sine'] as const)(
    'keep the power of the line, nearly all within Carson’s width: %s',
    (profile) => {
      const swept = { width: 1e6, rate: 30e3, profile }
      const { lines, count, spacing } = sidebandsOf(swept)
      let all = 0
      let within = 0
      for (let n = -count; n <= count; n += 1) {
        const power = (lines[2 * (n + count)] ?? 0) ** 2 + (lines[2 * (n + count) + 1] ?? 0) ** 2
        all += power
        if (Math.abs(n * spacing) <= carsonWidth(swept) / 2) within += power
      }
      expect(all).toBeCloseTo(1, 4)
      expect(within).toBeGreaterThan(0.97)
    },
  )
})

describe('the gain of spreading a line', () => {
  it('is nothing while the sweep stays within the passband', () => {
    const { peak, quasiPeak, average } = spreadReduction(line(40e3, 30e3), C)
    for (const reduction of [peak, quasiPeak ?? NaN, average]) expect(reduction).toBeLessThan(0.3)
  })

  it('is nothing for a peak detector that sweeps slowly pass, though the average falls', () => {
    const { peak, average } = spreadReduction(line(3e6, 1e3), C)
    expect(peak).toBeLessThan(0.2)
    expect(average).toBeGreaterThan(20)
  })

  it('is at most the even share of the power and 3 dB less at the edges, once sweeps are fast', () => {
    for (const rate of [60e3, 120e3, 240e3]) {
      const swept = line(5e6, rate)
      const even = evenSpreadReduction(swept, coupledStagesBandwidths(C.bandwidth).noise)
      const { peak, average } = spreadReduction(swept, C)
      expect(peak).toBeLessThan(even)
      expect(average).toBeGreaterThan(even - 3.5)
      expect(average).toBeLessThan(even + 3)
    }
  })

  it('of a sine is less than that of a triangle for slow sweeps, which lingers at the edges', () => {
    const triangle = spreadReduction(line(5e6, 30e3), C)
    const sine = spreadReduction({ width: 5e6, rate: 30e3, profile: 'sine' }, C)
    expect(sine.average).toBeLessThan(triangle.average - 2)
    expect(sine.peak).toBeLessThan(triangle.peak)
  })

  it('orders the detectors: peak gains least, average most', () => {
    for (const width of [0.2e6, 1e6, 5e6]) {
      const { peak, quasiPeak, average } = spreadReduction(line(width, 30e3), C)
      expect(quasiPeak).toBeGreaterThanOrEqual(peak - 0.05)
      expect(quasiPeak).toBeLessThanOrEqual(average + 0.05)
    }
  })

  it('has no quasi-peak above 1 GHz, and is not worked out for sweeps of too many lines', () => {
    expect(spreadReduction(line(5e6, 30e3), E).quasiPeak).toBeNull()
    expect(isWithinReach(line(5e6, 30e3), C)).toBe(true)
    expect(isWithinReach(line(5e6, 1), C)).toBe(false)
    expect(isWithinReach(line(5e6, 0), C)).toBe(false)
  })
})
