import { describe, expect, it } from 'vitest'

import { resultsOf } from './method-results'
import { expectWithin, input, referenceCases } from './reference-cases'

// Source: the far field of a magnetic dipole; the handbook number 131.6e-16 beside it, 0.07 % lower.
describe('emission of a small loop', () => {
  it.each(referenceCases('radiation.dm_loop'))('$id: $how_computed', (item) => {
    const result = resultsOf('small-loop-emission', {
      area: input(item, 'area'),
      current: input(item, 'i'),
      frequency: input(item, 'f'),
      distance: input(item, 'r'),
    })
    const isOverGround = item.inputs['ground_reflection'] === true
    expectWithin(item, {
      e_field: result?.(isOverGround ? 'fieldOverGround' : 'field') ?? NaN,
      ott_131p6e_minus16: result?.(isOverGround ? 'fieldOverGround' : 'field') ?? NaN,
      e_dbuv_per_m: result?.(isOverGround ? 'levelOverGround' : 'level') ?? NaN,
    })
  })
})

// Source: the far field of a short current element.
describe('emission of a cable', () => {
  it.each(referenceCases('radiation.cm_cable'))('$id', (item) => {
    const result = resultsOf('cable-emission', {
      length: input(item, 'length'),
      current: input(item, 'i_common_mode_total'),
      frequency: input(item, 'f'),
      distance: input(item, 'r'),
      limit: 30,
    })
    const isOverGround = item.inputs['ground_reflection'] === true
    expectWithin(item, {
      e_field: result?.(isOverGround ? 'fieldOverGround' : 'field') ?? NaN,
      e_dbuv_per_m: result?.(isOverGround ? 'levelOverGround' : 'level') ?? NaN,
      current_limit_for_30dbuvm: result?.(isOverGround ? 'allowedOverGround' : 'allowedCurrent') ?? NaN,
    })
  })
})

// Source: the transmission matrix of the sheet, whose attenuation is the sum of the three parts.
describe('skin depth and shielding of a plane wave', () => {
  it.each(referenceCases('shielding.skin_depth'))('$id', (item) => {
    const result = resultsOf('skin-depth', {
      conductivity: input(item, 'conductivity'),
      permeability: input(item, 'mu_r'),
      frequency: input(item, 'f'),
      thickness: input(item, 'thickness'),
    })
    expectWithin(item, {
      skin_depth: result?.('skinDepth') ?? NaN,
      absorption_db: result?.('absorption') ?? NaN,
      se_plane_wave_db: result?.('shielding') ?? NaN,
      reflection_db: result?.('reflection') ?? NaN,
    })
    // A difference of nearly equal numbers: its digits are counted in decibels.
    const again = Number(item.expected['re_reflection_db'])
    expect(Math.abs((result?.('multipleReflection') ?? NaN) - again)).toBeLessThan(1e-6)
  })
})

// Source: the definition of the wavelength; the fraction is common practice.
describe('distance of stitching vias', () => {
  it.each(referenceCases('shielding.stitching_spacing'))('$id', (item) => {
    const result = resultsOf('stitching-distance', {
      frequency: input(item, 'f_max'),
      permittivity: input(item, 'eps_eff'),
      fraction: input(item, 'fraction'),
    })
    expectWithin(item, { wavelength: result?.('wavelength') ?? NaN, spacing: result?.('distance') ?? NaN })
  })
})
