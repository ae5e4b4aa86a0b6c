import { describe, expect, it } from 'vitest'

import { linearTicks, logTicks } from '@/lib/figure/axis-ticks'
import { quantityOverUnit } from '@/lib/figure/axis-title'

describe('linear axis', () => {
  it('puts all ticks under one prefix and names it for the title', () => {
    const axis = linearTicks([0, 5e-7], 's', 5)
    expect(axis.titleUnit).toBe('ns')
    expect(axis.ticks.map((tick) => tick.label)).toEqual(['0', '100', '200', '300', '400', '500'])
  })

  it('writes as many decimals as its step needs', () => {
    const axis = linearTicks([-0.2, 0.3], 'dB', 5)
    expect(axis.ticks.map((tick) => tick.label)).toEqual(['−0.2', '−0.1', '0.0', '0.1', '0.2', '0.3'])
  })
})

describe('logarithmic axis', () => {
  it('rules a decade with its eight multiples between the powers of ten', () => {
    const axis = logTicks([1e6, 1e8], 'Hz', 8)
    expect(axis.major).toEqual([1e6, 1e7, 1e8])
    expect(axis.minor).toHaveLength(16)
    expect(axis.minor).toContain(3e7)
  })

  it('offers decades first and then the round ends of its range', () => {
    const axis = logTicks([30e6, 1e9], 'Hz', 8)
    const rank = (value: number) => axis.ticks.find((tick) => tick.value === value)?.rank
    expect(rank(1e8)).toBe(0)
    expect(rank(30e6)).toBe(1)
    expect(rank(7e8)).toBeGreaterThan(1)
    expect(axis.ticks.find((tick) => tick.value === 30e6)?.label).toBe('30\u00a0MHz')
  })

  it('falls back to even steps within a fraction of a decade', () => {
    const axis = logTicks([110e3, 190e3], 'Hz', 5)
    expect(axis.ticks.length).toBeGreaterThanOrEqual(3)
    expect(axis.ticks[0]?.label).toBe('120\u00a0kHz')
  })
})

describe('axis title', () => {
  it('is the quantity over its unit, a compound unit in brackets (SI Brochure, 5.4.1)', () => {
    expect(quantityOverUnit('Time', 'ns')).toBe('Time / ns')
    expect(quantityOverUnit('Field strength', 'dBµV/m')).toBe('Field strength / (dBµV/m)')
    expect(quantityOverUnit('Duty cycle', '')).toBe('Duty cycle')
  })
})
