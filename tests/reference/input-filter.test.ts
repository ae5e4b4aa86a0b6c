import { describe, expect, it } from 'vitest'

import { resultsOf } from './method-results'
import { expectWithin, input, referenceCases } from './reference-cases'

// Source: the transfer function of an undamped LC stage.
describe('corner of an input filter', () => {
  it.each(referenceCases('filter.required_attenuation'))('$id', (item) => {
    const result = resultsOf('filter-corner', {
      measured: input(item, 'measured_dbuv'),
      limit: input(item, 'limit_dbuv'),
      margin: input(item, 'margin_db'),
      frequency: input(item, 'f'),
    })
    expectWithin(item, {
      attenuation_db: result?.('attenuation') ?? NaN,
      fc_asymptotic_40db_per_decade: result?.('asymptoticCorner') ?? NaN,
      fc_exact_undamped: result?.('corner') ?? NaN,
      lc_product: (result?.('timeConstant') ?? NaN) ** 2,
    })
  })

  it('refuses where nothing has to be filtered', () => {
    expect(resultsOf('filter-corner', { measured: 40, limit: 56, margin: 6, frequency: 150e3 })).toBeNull()
  })
})

// Source: direct minimisation of the peak of the output impedance; the criterion after R. D. Middlebrook.
describe('damping of an input filter', () => {
  it.each(referenceCases('filter.parallel_rc_damping'))('$id', (item) => {
    const result = resultsOf('filter-damping', {
      inductance: input(item, 'l'),
      capacitance: input(item, 'c'),
      ratio: input(item, 'n'),
    })
    expectWithin(item, {
      r0: result?.('r0') ?? NaN,
      q_opt: result?.('relativeR') ?? NaN,
      rd_opt: result?.('rDamp') ?? NaN,
      cd: result?.('cDamp') ?? NaN,
      z_peak: result?.('peakImpedance') ?? NaN,
      z_peak_over_r0: result?.('relativePeak') ?? NaN,
      f_peak: result?.('peakFrequency') ?? NaN,
    })
  })

  it.each(referenceCases('filter.impedance_criterion'))('$id', (item) => {
    // n = 2 has its peak at √2 R₀.
    const r0 = input(item, 'z_out_peak') / Math.SQRT2
    const result = resultsOf('filter-damping', {
      inductance: r0 * 1e-6,
      capacitance: 1e-6 / r0,
      ratio: 2,
      vIn: input(item, 'v_in'),
      pIn: input(item, 'p_in'),
    })
    expectWithin(item, {
      z_in_incremental: result?.('inputResistance') ?? NaN,
      ratio_db: result?.('impedanceMargin') ?? NaN,
    })
  })
})
