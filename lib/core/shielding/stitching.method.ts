import { defineMethod, type ResultValue } from '../method/method'
import { main, step } from '../method/result-value'
import { speedOfLight } from '../physics/constants'
import { ok } from '../result'

const usualFraction = 20

/** How close vias must stand that tie two planes or a guard together. */
export const stitchingDistance = defineMethod({
  id: 'stitching-distance',
  version: 2,
  title: 'Distance and number of stitching vias',
  purpose:
    'Gives the largest distance between vias that tie planes or a guard ring together up to a frequency, and how many a length needs.',
  inputs: {
    frequency: {
      label: 'Highest frequency',
      symbol: 'f_max',
      unit: 'Hz',
      help: 'That matters: of the limit, or 1/(π t) of the fastest edge',
      isRequired: true,
      atLeast: 1e3,
      atMost: 1e13,
    },
    permittivity: {
      label: 'Effective relative permittivity',
      symbol: 'ε_eff',
      unit: '',
      help: 'Between the planes that of the laminate, about 4.2 for FR-4',
      isRequired: true,
      atLeast: 1,
      atMost: 1000,
    },
    fraction: {
      label: 'Parts of a wavelength',
      symbol: 'N',
      unit: '',
      help: 'Left empty, 20; 10 is sometimes taken',
      isRequired: false,
      atLeast: 2,
      atMost: 1000,
    },
    length: {
      label: 'Length to stitch',
      symbol: 'l',
      unit: 'm',
      help: 'Along the edge or the guard, from its first to its last via; for their number',
      isRequired: false,
      atLeast: 1e-6,
      atMost: 1000,
    },
  },
  formulas: [
    'λ = c / (f_max √ε_eff)',
    's = λ / N',
    'n = ⌈l/s⌉ + 1 along an open line,   ⌈l/s⌉ around a closed one',
  ],
  notes: [
    'A twentieth of a wavelength is a rule of thumb: shorter helps, and nothing changes suddenly at it.',
  ],
  cautions: ['A rule of thumb is no statement of conformity.'],
  sources: [
    {
      citation: 'A twentieth of a wavelength between stitching vias',
      standing: 'common practice, no source',
    },
  ],
  example: { frequency: '1 GHz', permittivity: '4.3', length: '120 mm' },
  compute: ({ frequency, permittivity, fraction = usualFraction, length }) => {
    const wavelength = speedOfLight / (frequency * Math.sqrt(permittivity))
    const distance = wavelength / fraction
    return ok({
      results: [
        main('distance', 'Largest distance', 's', 'm', distance),
        ...(length === undefined ? [] : numbersOf(length, distance)),
        step('wavelength', 'Wavelength', 'λ', 'm', wavelength),
      ],
      choices: [],
      validity: [],
      figures: [],
    })
  },
})

/** Vias along an open line stand at both of its ends; around a closed one the first is the last. */
function numbersOf(length: number, distance: number): readonly ResultValue[] {
  // A length that is a whole number of distances, but for rounding, needs no via more.
  const gaps = Math.max(1, Math.ceil(length / distance - 1e-9))
  return [
    main('count', 'Vias along an open line', 'n', '', gaps + 1),
    step('closedCount', 'Vias around a closed line', 'n', '', gaps),
  ]
}
