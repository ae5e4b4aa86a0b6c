import { wavelengthOf } from '../emission/radiated-field'
import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { vacuumPermeability } from '../physics/constants'
import { ok } from '../result'
import { magneticDipole } from './magnetic-dipole'

const needed = { isRequired: true, above: 0, atMost: 1e15 } as const

/** Near and far field of a small current loop. */
export const magneticDipoleField = defineMethod({
  id: 'magnetic-dipole-field',
  version: 1,
  title: 'Near field of a small loop',
  purpose: 'Gives the magnetic and electric field of a small current loop at any distance, near or far.',
  inputs: {
    area: { label: 'Area of the loop', symbol: 'A', unit: 'm²', help: 'Enclosed by the current', ...needed },
    current: { label: 'Current', symbol: 'I', unit: 'A', help: 'Of the harmonic, rms', ...needed },
    frequency: { label: 'Frequency', symbol: 'f', unit: 'Hz', help: 'Of the harmonic', ...needed },
    distance: { label: 'Distance', symbol: 'r', unit: 'm', help: 'From the middle of the loop', ...needed },
    angle: {
      label: 'Angle from the axis',
      symbol: 'θ',
      unit: '°',
      help: '90° in the plane of the loop',
      isRequired: true,
      atLeast: 0,
      atMost: 180,
    },
  },
  formulas: [
    'H_r = m cos θ √(1 + (kr)²)/(2π r³),   m = I A,   k = 2π f/c',
    'H_θ = m sin θ √((1 − (kr)²)² + (kr)²)/(4π r³)',
    'E_φ = ω µ₀ m sin θ √(1 + (kr)²)/(4π r²)',
  ],
  notes: [
    'Below kr = 1 the field falls by 60 dB a decade; a strong reading of a near-field probe is a candidate for the source of a far-field problem, not its proof.',
    'The wave impedance is far below 377 Ω near the loop: shields that reflect a plane wave well do little there.',
  ],
  cautions: ['An estimate in free space: planes, cables and housings change it by many decibels.'],
  sources: [
    { citation: 'C. A. Balanis, Antenna Theory, small loop (from memory)', standing: 'published' },
    { citation: 'Retarded potentials of a ring of current', standing: 'derived here, checked from outside' },
  ],
  example: { area: '1 mm²', current: '0.5 A', frequency: '10 MHz', distance: '50 mm', angle: '60' },
  compute: ({ area, current, frequency, distance, angle }) => {
    const field = magneticDipole(current * area, frequency, distance, (angle * Math.PI) / 180)
    const size = Math.hypot(field.radial, field.transverse)
    const extent = Math.sqrt(area / Math.PI)
    const isSmall = extent <= 0.2 * distance
    const isShort = 2 * Math.PI * extent <= wavelengthOf(frequency) / 4
    return ok({
      results: [
        main('magnetic', 'Magnetic field, both parts', 'H', 'A/m', size),
        main('fluxDensity', 'Magnetic flux density', 'B', 'T', vacuumPermeability * size),
        main('electric', 'Electric field', 'E_φ', 'V/m', field.electric),
        step('radial', 'Radial magnetic field', 'H_r', 'A/m', field.radial),
        step('transverse', 'Transverse magnetic field', 'H_θ', 'A/m', field.transverse),
        step('kr', 'Distance in λ/2π', 'kr', '', field.kr),
        ...(field.transverse > 0
          ? [step('waveImpedance', 'Wave impedance', 'E_φ/H_θ', 'Ω', field.electric / field.transverse)]
          : []),
      ],
      choices: [],
      validity: [
        {
          passed: isSmall,
          sentence: isSmall
            ? 'The loop is small against the distance.'
            : 'The loop is larger than a fifth of the distance: its shape matters; use the field of the drawn loop.',
        },
        {
          passed: isShort,
          sentence: isShort
            ? 'The perimeter is below a quarter of the wavelength.'
            : 'The perimeter is above a quarter of the wavelength: the current is not the same all around.',
        },
      ],
      figures: [],
    })
  },
})
