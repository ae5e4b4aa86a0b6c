import { describe, expect, it } from 'vitest'

import { resultsOf } from './method-results'

// Common practice, no source.
describe('facts of the trade about switching', () => {
  it('10 A in 2 ns is 5 A/ns, so each nanohenry takes 5 V', () => {
    const result = resultsOf('loop-voltage', { inductance: 1e-9, change: 10, time: 2e-9 })
    expect(result?.('voltage')).toBeCloseTo(5, 12)
  })

  it('3 times the parasitic capacitance added halves the ring frequency', () => {
    const result = resultsOf('ring-parasitics', { f0: 100e6, f1: 50e6, cAdd: 300e-12 })
    expect(result?.('cPar')).toBeCloseTo(100e-12, 20)
    expect(result?.('lPar')).toBeCloseTo(25.33e-9, 11)
    expect(result?.('z0')).toBeCloseTo(15.92, 2)
  })

  it('300 pF charged to 12 V and back 500,000 times a second burns 21.6 mW', () => {
    const result = resultsOf('rc-snubber-loss', { rSnub: 10, cSnub: 300e-12, vStep: 12, fSw: 500e3 })
    expect(result?.('power')).toBeCloseTo(21.6e-3, 9)
  })
})
