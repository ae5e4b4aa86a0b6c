import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { planeWaveShielding, skinDepth, type Sheet } from './plane-shield'

/** Annealed copper at 20 °C, S/m (IACS, IEC 60028). */
const copper = 58e6

/** Skin depth of a conductor, and what a sheet of it does to a plane wave. */
export const planeShield = defineMethod({
  id: 'skin-depth',
  version: 1,
  title: 'Skin depth and shielding of a plane',
  purpose:
    'Tells how deep a current flows in a conductor, and how much a sheet or a plane weakens a plane wave.',
  inputs: {
    frequency: {
      label: 'Frequency',
      symbol: 'f',
      unit: 'Hz',
      help: 'Of the current or field',
      isRequired: true,
      atLeast: 1,
      atMost: 1e12,
    },
    thickness: {
      label: 'Thickness',
      symbol: 't',
      unit: 'm',
      help: 'Of the sheet; 35 µm for a copper layer of one ounce',
      isRequired: true,
      atLeast: 1e-8,
      atMost: 1,
    },
    conductivity: {
      label: 'Conductivity',
      symbol: 'σ',
      unit: 'S/m',
      help: 'Left empty, that of copper: 58 MS/m',
      isRequired: false,
      atLeast: 1e3,
      atMost: 1e9,
    },
    permeability: {
      label: 'Relative permeability',
      symbol: 'µ_r',
      unit: '',
      help: 'At this frequency; left empty, 1',
      isRequired: false,
      atLeast: 0.9,
      atMost: 1e6,
    },
  },
  formulas: [
    'δ = 1 / √(π f µ₀ µ_r σ)',
    'A = 8.686 dB · t/δ',
    'R = 20 lg |(η₀ + Z_s)² / (4 η₀ Z_s)|,   Z_s = (1 + j)/(σδ)',
    'B = 20 lg |1 − q² e^(−2(1 + j) t/δ)|,   q = (η₀ − Z_s)/(η₀ + Z_s)',
    'SE = A + R + B',
  ],
  notes: [
    'The reflection R is that of a plane wave. The magnetic field of a loop close to a sheet is reflected far less: never quote R for it.',
    'Slots, seams and gaps in a real shield let through more than its metal does.',
    'The permeability of steel falls with frequency; a catalogue value for direct current does not hold at 1 MHz.',
  ],
  cautions: ['A computed shielding is an estimate for an infinite sheet, never a statement of conformity.'],
  sources: [
    {
      citation: 'H. W. Ott, Electromagnetic Compatibility Engineering, ch. 6 (from memory)',
      standing: 'published',
    },
    {
      citation: 'Sum of the three parts equal to the transmission matrix of the sheet',
      standing: 'derived here, checked from outside',
    },
    { citation: 'Conductivity of copper: IEC 60028 (from memory)', standing: 'published' },
  ],
  example: { frequency: '30 MHz', thickness: '35 µm', conductivity: '58 MS/m', permeability: '1' },
  compute: ({ frequency, thickness, conductivity = copper, permeability = 1 }) => {
    const sheet: Sheet = { conductivity, permeability, thickness }
    const depth = skinDepth(frequency, sheet)
    const { absorption, reflection, multipleReflection } = planeWaveShielding(frequency, sheet)
    const isThick = thickness >= 2 * depth
    return ok({
      results: [
        main('skinDepth', 'Skin depth', 'δ', 'm', depth),
        main(
          'shielding',
          'Shielding of a plane wave',
          'SE',
          'dB',
          absorption + reflection + multipleReflection,
        ),
        main('absorption', 'Absorption', 'A', 'dB', absorption),
        step('reflection', 'Reflection of a plane wave', 'R', 'dB', reflection),
        step('multipleReflection', 'Multiple reflection', 'B', 'dB', multipleReflection),
        step('surfaceResistance', 'Surface resistance', '1/(σδ)', 'Ω', 1 / (conductivity * depth)),
      ],
      choices: [],
      validity: [
        {
          passed: isThick,
          sentence: isThick
            ? 'The sheet is at least two skin depths thick: currents of its two faces are apart.'
            : 'The sheet is less than two skin depths thick: currents of one face reach the other.',
        },
      ],
      figures: [],
    })
  },
})
