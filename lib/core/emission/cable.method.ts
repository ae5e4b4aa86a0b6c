import { defineMethod } from '../method/method'
import { step } from '../method/result-value'
import { ok } from '../result'
import { emissionCautions, emissionInputs } from './emission-inputs'
import { farFieldCheck, fieldResults, shortSourceCheck } from './field-results'
import { shortCableField, wavelengthOf } from './radiated-field'

/** Far field of a common-mode current on a cable. */
export const cableEmission = defineMethod({
  id: 'cable-emission',
  version: 1,
  title: 'Emission of a cable',
  purpose:
    'Estimates the far field of a common-mode current on a cable, and the current that a limit allows.',
  inputs: {
    ...emissionInputs,
    length: {
      label: 'Length of the cable',
      symbol: 'L',
      unit: 'm',
      help: 'The straight part that radiates',
      isRequired: true,
      above: 0,
      atMost: 1e4,
    },
    current: {
      label: 'Common-mode current',
      symbol: 'I',
      unit: 'A',
      help: 'Of all wires together, rms: what a clamp around the cable reads',
      isRequired: true,
      above: 0,
      atMost: 1e6,
    },
  },
  formulas: ['E = (µ₀/2) f I L / r = 6.283·10⁻⁷ f I L / r', 'With full ground reflection: 2E, 6.02 dB more'],
  notes: [
    '“1.257·10⁻⁶ f I L / r” holds a factor of 2: full ground reflection, or two wires that carry I each. Using it and adding 6 dB for the ground counts that twice.',
    'A few microamperes are enough to reach a limit: measure the cable with a clamp before changing the board.',
    'Beyond a quarter of the wavelength a cable resonates; the formula then gives too much.',
  ],
  cautions: emissionCautions,
  sources: [
    {
      citation: 'C. R. Paul, Introduction to Electromagnetic Compatibility, ch. 8 (from memory)',
      standing: 'published',
    },
    { citation: 'Far field of a short current element', standing: 'derived here, checked from outside' },
  ],
  example: { length: '1 m', current: '5 µA', frequency: '50 MHz', distance: '3 m', limit: '40 dBµV/m' },
  compute: ({ frequency, distance, length, current, limit }) =>
    ok({
      results: [
        ...fieldResults(shortCableField(frequency, length, current, distance), current, limit),
        step('wavelength', 'Wavelength', 'λ', 'm', wavelengthOf(frequency)),
      ],
      choices: [],
      validity: [farFieldCheck(frequency, distance), shortSourceCheck(frequency, length, 'The cable')],
      figures: [],
    }),
})
