import { describe, expect, it } from 'vitest'

import {
  columnLabels,
  engineeringLabel,
  engineeringScale,
  plainNumber,
  roundLabel,
} from '@/lib/figure/engineering-label'

describe('engineering labels', () => {
  it.each([
    [1.803e8, 'Hz', '180.3', 'MHz'],
    [4.7e-9, 'F', '4.700', 'nF'],
    [1e-9, 's', '1.000', 'ns'],
    [1e6, 'Hz', '1.000', 'MHz'],
    [999.96e6, 'Hz', '1.000', 'GHz'],
    [-0.9304, 'V', '−930.4', 'mV'],
    [47, 'Ω', '47.00', 'Ω'],
    [5e4, 'V/s', '50.00', 'kV/s'],
  ])('writes %d %s as %s %s', (value, unit, number, scaled) => {
    expect(engineeringLabel(value, unit)).toEqual({ number, unit: scaled })
  })

  it('gives no prefix to decibels, per cent, degrees and pure numbers', () => {
    for (const unit of ['dBµV', 'dB', '%', '°C', '']) {
      expect(engineeringScale(12_000, unit)).toEqual({ exponent: 0, unit })
    }
  })

  it('stays inside the prefixes it knows at both ends', () => {
    expect(engineeringScale(1e-20, 'F').unit).toBe('aF')
    expect(engineeringScale(1e16, 'Hz').unit).toBe('THz')
  })

  it('writes a true minus sign and never a negative zero', () => {
    expect(plainNumber(-4.1, 1)).toBe('−4.1')
    expect(plainNumber(-0.001, 1)).toBe('0.0')
    expect(engineeringLabel(0, 'V').number).toBe('0')
  })

  it('says nothing for a value that is not a number', () => {
    expect(engineeringLabel(NaN, 'V').number).toBe('–')
    expect(engineeringLabel(Infinity, 'V').number).toBe('–')
  })

  it('writes round axis values without needless digits', () => {
    expect(roundLabel(3e7, 'Hz')).toBe('30\u00a0MHz')
    expect(roundLabel(0.05, '')).toBe('0.05')
  })

  it('puts one prefix on a column, chosen by its largest value', () => {
    expect(columnLabels([-1.216, 0.8618, 0], 'V')).toEqual([
      { number: '−1.216', unit: 'V' },
      { number: '0.862', unit: 'V' },
      { number: '0.000', unit: 'V' },
    ])
  })

  it('labels a column of zeros or of nothing', () => {
    expect(columnLabels([0, NaN], 'V').map((label) => label.number)).toEqual(['0.000', '–'])
    expect(columnLabels([], 'V')).toEqual([])
  })
})
