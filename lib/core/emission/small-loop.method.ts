import { defineMethod } from '../method/method'
import { step } from '../method/result-value'
import { ok } from '../result'
import { emissionCautions, emissionInputs } from './emission-inputs'
import { farFieldCheck, fieldResults, shortSourceCheck } from './field-results'
import { smallLoopField, wavelengthOf } from './radiated-field'

/** Far field of a differential-mode current in a small loop. */
export const smallLoopEmission = defineMethod({
  id: 'small-loop-emission',
  version: 1,
  title: 'Emission of a small loop',
  purpose: 'Estimates the far field of a differential-mode current in a loop on the board.',
  inputs: {
    ...emissionInputs,
    area: {
      label: 'Area of the loop',
      symbol: 'A',
      unit: 'm²',
      help: 'Enclosed by the current and its return',
      isRequired: true,
      above: 0,
      atMost: 100,
    },
    current: {
      label: 'Current',
      symbol: 'I',
      unit: 'A',
      help: 'Of the harmonic, rms',
      isRequired: true,
      above: 0,
      atMost: 1e6,
    },
  },
  formulas: [
    'E = η₀ π f² A I / (c² r) = 1.317·10⁻¹⁴ f² A I / r',
    'With full ground reflection: 2E, 6.02 dB more',
  ],
  notes: [
    '“131.6·10⁻¹⁶” is the same number with 120π Ω and 3·10⁸ m/s; “263·10⁻¹⁶” is it with full ground reflection. Adding 6 dB to the latter counts the ground twice.',
    'Only the area and the square of the frequency count, not the shape, as long as the loop is small.',
  ],
  cautions: emissionCautions,
  sources: [
    {
      citation: 'H. W. Ott, Electromagnetic Compatibility Engineering, ch. 12 (from memory)',
      standing: 'published',
    },
    { citation: 'Far field of a magnetic dipole', standing: 'derived here, checked from outside' },
  ],
  example: { area: '4 cm²', current: '20 mA', frequency: '180 MHz', distance: '3 m', limit: '43.5 dBµV/m' },
  compute: ({ frequency, distance, area, current, limit }) =>
    ok({
      results: [
        ...fieldResults(smallLoopField(frequency, area, current, distance), current, limit),
        step('wavelength', 'Wavelength', 'λ', 'm', wavelengthOf(frequency)),
      ],
      choices: [],
      validity: [
        farFieldCheck(frequency, distance),
        // No loop of this area has a shorter perimeter than the circle.
        shortSourceCheck(frequency, 2 * Math.sqrt(Math.PI * area), 'The perimeter of a circle of this area'),
      ],
      figures: [],
    }),
})
