import { describe, expect, it } from 'vitest'

import { decrementOf, naturalFrequency } from '@/lib/core/snubber/parasitics'

import { resultsOf } from './method-results'
import { expectWithin, input, referenceCases } from './reference-cases'

// Source: the closed form in 40-digit arithmetic, and a search for L and C whose roots give back both frequencies.
describe('parasitics from two ring frequencies', () => {
  it.each(referenceCases('snubber.parasitics_two_freq'))('$id: $how_computed', (item) => {
    const raw = { f0: input(item, 'f0'), f1: input(item, 'f1'), cAdd: input(item, 'c_add') }
    const result = resultsOf('ring-parasitics', raw)
    if (item.expect_error) {
      expect(result).toBeNull()
      return
    }
    expectWithin(item, {
      c_par: result?.('cPar') ?? NaN,
      l_par: result?.('lPar') ?? NaN,
      z0: result?.('z0') ?? NaN,
    })
  })

  it.each(referenceCases('snubber.parasitics_two_freq_damped'))('$id: $how_computed', (item) => {
    const result = resultsOf('ring-parasitics', {
      f0: input(item, 'f0_damped'),
      zeta0: input(item, 'zeta0'),
      f1: input(item, 'f1_damped'),
      zeta1: input(item, 'zeta1'),
      cAdd: input(item, 'c_add'),
    })
    expectWithin(item, {
      f0_undamped: result?.('f0Natural') ?? NaN,
      f1_undamped: result?.('f1Natural') ?? NaN,
      c_par: result?.('cPar') ?? NaN,
      l_par: result?.('lPar') ?? NaN,
      z0: result?.('z0') ?? NaN,
    })
  })
})

// Source: textbook theory of the damped oscillator, in 40-digit arithmetic.
describe('damping from two peaks', () => {
  it.each(referenceCases('snubber.log_decrement'))('$id: $how_computed', (item) => {
    const found = decrementOf(input(item, 'first_peak'), input(item, 'later_peak'), input(item, 'cycles'))
    if (!found.ok) throw new Error('A decrement was expected')
    expectWithin(item, {
      log_decrement: found.value.logarithmicDecrement,
      damping_ratio: found.value.dampingRatio,
      q_factor: found.value.qualityFactor,
      f_natural: naturalFrequency(input(item, 'f_damped'), found.value.dampingRatio),
    })
  })

  it('refuses an amplitude that grows', () => {
    expect(decrementOf(1, 1.2, 3).ok).toBe(false)
  })
})

// Source: the resonance formula, turned round on the cases with two frequencies.
describe('inductance from one ring frequency', () => {
  it.each(referenceCases('snubber.parasitics_two_freq').filter((item) => !item.expect_error))(
    '$id',
    (item) => {
      const raw = { f0: input(item, 'f0'), cPar: Number(item.expected['c_par']) }
      const result = resultsOf('ring-inductance', raw)
      expectWithin(item, { l_par: result?.('lPar') ?? NaN, z0: result?.('z0') ?? NaN })
    },
  )
})

// Source: the energy integral of the linear fall of the current, by quadrature.
describe('RCD clamp', () => {
  it.each(referenceCases('snubber.rcd_clamp'))('$id: $how_computed', (item) => {
    const result = resultsOf('rcd-clamp', {
      lLeak: input(item, 'l_leak'),
      iPeak: input(item, 'i_peak'),
      fSw: input(item, 'f'),
      vClamp: input(item, 'v_clamp'),
      turnsRatio: input(item, 'n_ratio'),
      vOut: input(item, 'v_out'),
      ripple: input(item, 'ripple_v'),
    })
    if (item.expect_error) {
      expect(result).toBeNull()
      return
    }
    expectWithin(item, {
      power: result?.('power') ?? NaN,
      r_clamp: result?.('rClamp') ?? NaN,
      c_clamp: result?.('cClamp') ?? NaN,
      t_reset: result?.('resetTime') ?? NaN,
    })
  })
})
