import { describe, expect, it } from 'vitest'

import { wideStripOverPlane, wireOverPlane } from '@/lib/core/inductance/line'
import { planeSpreading, viaWithReturns } from '@/lib/core/inductance/via'

import { resultsOf } from './method-results'
import { expectWithin, input, referenceCases } from './reference-cases'

// Source: Maxwell 1865; the perfect conductor by an integral equation for constant flux.
describe('a circular loop', () => {
  it.each(referenceCases('loop.circular'))('$id', (item) => {
    const [radius, wireRadius] = [input(item, 'radius'), input(item, 'wire_radius')]
    const result = resultsOf('circular-loop-inductance', { radius, wireRadius })
    const surface = result?.('surface') ?? NaN
    expectWithin(item, { l_surface_thin: surface, l_uniform_thin: result?.('uniform') ?? NaN })
    const exact = Number(item.expected['l_perfect_conductor_exact'])
    expect(surface / exact - 1).toBeGreaterThan(0)
    expect(surface / exact - 1).toBeLessThan(0.004)
  })
})

// Source: exact partial inductances by integration over the cross-section, 1 % for corners and ends.
describe('a rectangular loop of round wire', () => {
  it.each(referenceCases('loop.rectangular_round_wire'))('$id', (item) => {
    const result = resultsOf('rectangular-loop-inductance', {
      width: input(item, 'width'),
      height: input(item, 'height'),
      wireRadius: input(item, 'wire_radius'),
    })
    const [surface, uniform] = [result?.('inductance') ?? NaN, result?.('uniform') ?? NaN]
    expectWithin(item, {
      l_grover_surface: surface,
      l_grover_uniform: uniform,
      l_exact_partials_surface: surface,
      l_exact_partials_uniform: uniform,
    })
  })
})

// Source: four rectangular bars, self and mutual exact after Hoer and Love 1965, in 60-digit arithmetic.
describe('a rectangular loop of flat trace', () => {
  it.each(referenceCases('loop.rectangular_flat_trace'))('$id', (item) => {
    const result = resultsOf('rectangular-loop-inductance', {
      width: input(item, 'width'),
      height: input(item, 'height'),
      traceWidth: input(item, 'trace_width'),
      thickness: input(item, 'trace_thickness'),
    })
    const inductance = result?.('inductance') ?? NaN
    expectWithin(item, { l_gmd: inductance })
    expect(Math.abs(inductance / Number(item.expected['l_exact_bars']) - 1)).toBeLessThan(0.01)
  })
})

// Source: an integral equation for the current on a thin strip over a perfect plane.
describe('a trace over a plane', () => {
  it.each(referenceCases('line.microstrip_inductance'))('$id', (item) => {
    const [width, height] = [input(item, 'width'), input(item, 'height')]
    const result = resultsOf('trace-over-plane-inductance', { width, height, length: 0.01 })
    const perLength = result?.('perLength') ?? NaN
    expectWithin(item, {
      lp_exact_thin: perLength,
      lp_hammerstad_jensen: perLength,
      lp_wide_plate: wideStripOverPlane(width, height),
    })
    expect(result?.('inductance')).toBeCloseTo(perLength * 0.01, 15)
  })
})

// Source: two-dimensional field of perfect conductors, in closed form.
describe('wires', () => {
  it.each(referenceCases('line.round_pair'))('pair: $id', (item) => {
    const raw = { spacing: input(item, 'spacing'), radius: input(item, 'radius') }
    const result = resultsOf('wire-pair-inductance', raw)
    expectWithin(item, {
      lp_hf_exact: result?.('surface') ?? NaN,
      lp_uniform_current: result?.('uniform') ?? NaN,
    })
    expect(resultsOf('wire-pair-inductance', { ...raw, spacing: 2 * raw.radius })).toBeNull()
  })

  it.each(referenceCases('line.round_wire_over_plane'))('over a plane: $id', (item) => {
    expectWithin(item, { lp_hf_exact: wireOverPlane(input(item, 'height_centre'), input(item, 'radius')) })
  })
})

// Source: two-dimensional field between two perfect planes, in closed form.
describe('vias between planes', () => {
  it.each(referenceCases('via.pair_between_planes'))('pair: $id', (item) => {
    const raw = {
      height: input(item, 'height'),
      distance: input(item, 'spacing'),
      diameter: input(item, 'diameter'),
    }
    expectWithin(item, {
      l_exact: resultsOf('via-return-inductance', raw)?.('inductance') ?? NaN,
      l_thin: viaWithReturns(raw.height, raw.distance, raw.diameter, 1),
    })
  })

  it.each(referenceCases('via.signal_with_n_returns'))('several returns: $id', (item) => {
    const result = resultsOf('via-return-inductance', {
      height: input(item, 'height'),
      distance: input(item, 'radius_of_returns'),
      diameter: input(item, 'diameter'),
      count: input(item, 'n_returns'),
    })
    expectWithin(item, { l: result?.('inductance') ?? NaN })
  })

  it.each(referenceCases('plane.radial_spreading'))('spreading: $id', (item) => {
    const { height, outer, via } = {
      height: input(item, 'height'),
      outer: input(item, 'outer_radius'),
      via: input(item, 'via_radius'),
    }
    expectWithin(item, { l: planeSpreading(height, outer, via) })
  })
})

// Source: the law of induction.
describe('the voltage over a loop', () => {
  it.each(referenceCases('loop.voltage'))('$id', (item) => {
    const raw = { inductance: input(item, 'l'), change: input(item, 'di'), time: input(item, 'dt') }
    expectWithin(item, { v: resultsOf('loop-voltage', raw)?.('voltage') ?? NaN })
  })
})
