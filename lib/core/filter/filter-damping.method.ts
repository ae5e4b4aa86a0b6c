import { defineMethod, noSolution, type ResultValue, type ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { nearestByRatio } from '../parts/preferred-values'
import { err, ok } from '../result'
import { filterDampingTexts } from './filter-damping.texts'
import { optimalDamping } from './low-pass'

/** The damping of an input filter, and whether the converter behind it stays stable. */
export const filterDamping = defineMethod({
  id: 'filter-damping',
  version: 1,
  ...filterDampingTexts,
  inputs: {
    inductance: {
      label: 'Filter inductance',
      symbol: 'L',
      unit: 'H',
      help: 'At its bias current',
      isRequired: true,
      atLeast: 1e-12,
      atMost: 1e3,
    },
    capacitance: {
      label: 'Filter capacitance',
      symbol: 'C',
      unit: 'F',
      help: 'At its bias voltage',
      isRequired: true,
      atLeast: 1e-15,
      atMost: 1e3,
    },
    ratio: {
      label: 'Ratio of damping capacitance',
      symbol: 'n',
      unit: '',
      help: 'C_d/C; 4 is a usual choice',
      isRequired: true,
      atLeast: 0.01,
      atMost: 1000,
    },
    vIn: {
      label: 'Input voltage',
      symbol: 'V_in',
      unit: 'V',
      help: 'The lowest one of the converter; with the power, for the check of stability',
      isRequired: false,
      above: 0,
      atMost: 1e6,
    },
    pIn: {
      label: 'Input power',
      symbol: 'P_in',
      unit: 'W',
      help: 'The highest one of the converter',
      isRequired: false,
      above: 0,
      atMost: 1e9,
    },
  },
  example: { inductance: '4.7 µH', capacitance: '10 µF', ratio: '4', vIn: '48 V', pIn: '60 W' },
  compute: ({ inductance, capacitance, ratio, vIn, pIn }) => {
    if ((vIn === undefined) !== (pIn === undefined)) {
      const missing = vIn === undefined ? 'vIn' : 'pIn'
      return err(
        noSolution('The check of stability needs both the input voltage and the input power.', missing),
      )
    }
    const damped = optimalDamping(inductance, capacitance, ratio)
    const incremental = vIn === undefined || pIn === undefined ? undefined : vIn ** 2 / pIn
    return ok({
      results: [
        main('rDamp', 'Damping resistor', 'R_d', 'Ω', damped.resistance),
        main('cDamp', 'Damping capacitor', 'C_d', 'F', damped.capacitance),
        main('peakImpedance', 'Peak of the output impedance', '|Z|max', 'Ω', damped.peakImpedance),
        step('r0', 'Characteristic impedance', 'R₀', 'Ω', damped.characteristicImpedance),
        step(
          'relativeR',
          'Damping resistor in R₀',
          'R_d/R₀',
          '',
          damped.resistance / damped.characteristicImpedance,
        ),
        step(
          'relativePeak',
          'Peak in R₀',
          '|Z|max/R₀',
          '',
          damped.peakImpedance / damped.characteristicImpedance,
        ),
        step('peakFrequency', 'Frequency of the peak', 'f_m', 'Hz', damped.peakFrequency),
        step('rStandard', 'Nearest E24 resistor', 'R_d', 'Ω', nearestByRatio(damped.resistance, 'E24')),
        step('cStandard', 'Nearest E12 capacitor', 'C_d', 'F', nearestByRatio(damped.capacitance, 'E12')),
        ...(incremental === undefined ? [] : stabilityResults(incremental, damped.peakImpedance)),
      ],
      choices: [],
      validity: incremental === undefined ? [] : [stabilityCheck(incremental / damped.peakImpedance)],
      figures: [],
    })
  },
})

const stabilityResults = (incremental: number, peak: number): readonly ResultValue[] => [
  main(
    'impedanceMargin',
    'Input resistance above the peak',
    '|Z_in|/|Z|max',
    'dB',
    20 * Math.log10(incremental / peak),
  ),
  step('inputResistance', 'Incremental input resistance', '−V²/P', 'Ω', -incremental),
]

function stabilityCheck(ratio: number): ValidityCheck {
  const isStable = ratio >= 2
  return {
    passed: isStable,
    sentence: isStable
      ? 'The filter’s output impedance stays at least 6 dB below the converter’s input resistance.'
      : 'The filter’s output impedance comes within 6 dB of the converter’s input resistance: it may oscillate. Take a larger C or n, or a smaller L.',
  }
}
