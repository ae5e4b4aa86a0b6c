import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { cornerFor } from './low-pass'

const level = { unit: 'dBµV', isRequired: true, atLeast: -200, atMost: 300 } as const

/** The corner of an input filter from a measured level and its limit. */
export const filterCorner = defineMethod({
  id: 'filter-corner',
  version: 1,
  title: 'Corner of an input filter',
  purpose:
    'Turns a measured conducted level and its limit into the corner frequency and the L·C that a filter stage needs.',
  inputs: {
    measured: {
      label: 'Measured level',
      symbol: 'U',
      help: 'Differential mode, without the filter',
      ...level,
    },
    limit: {
      label: 'Limit',
      symbol: 'U_lim',
      help: 'At this frequency, from the standard in force',
      ...level,
    },
    margin: {
      label: 'Margin',
      symbol: 'M',
      unit: 'dB',
      help: 'To be kept below the limit; 6 dB is usual before a test',
      isRequired: true,
      atLeast: 0,
      atMost: 100,
    },
    frequency: {
      label: 'Frequency',
      symbol: 'f',
      unit: 'Hz',
      help: 'Of the level; the lowest harmonic above the limit decides',
      isRequired: true,
      above: 0,
      atMost: 1e12,
    },
    inductance: {
      label: 'Inductance',
      symbol: 'L',
      unit: 'H',
      help: 'If one is chosen, the capacitance for it is given; left empty, none',
      isRequired: false,
      atLeast: 1e-12,
      atMost: 1e3,
    },
  },
  formulas: [
    'A = U − U_lim + M',
    'Exact, undamped: f_c = f / √(1 + 10^(A/20))',
    'Asymptotic, 40 dB a decade: f_c = f · 10^(−A/40)',
    'L C = 1 / (2π f_c)²',
  ],
  notes: [
    'The asymptotic corner is too high for less than about 20 dB; the exact one is used for L·C.',
    'The capacitor’s inductance ends the slope of 40 dB a decade, often at a few megahertz; above, layout decides.',
    'Common-mode emission needs another filter: separate the modes before choosing parts.',
  ],
  cautions: [
    'An undamped filter can make the converter oscillate: check the damping next.',
    'Capacitors across the mains need safety ratings and a discharge path; local codes and licensed practice come first.',
    'An estimate is never a statement of conformity.',
  ],
  sources: [
    {
      citation: 'Attenuation of an undamped LC stage: elementary circuit theory',
      standing: 'derived here, checked from outside',
    },
  ],
  example: {
    measured: '92 dBµV',
    limit: '60 dBµV',
    margin: '6 dB',
    frequency: '420 kHz',
    inductance: '4.7 µH',
  },
  compute: ({ measured, limit, margin, frequency, inductance }) => {
    const attenuation = measured - limit + margin
    if (!(attenuation > 0)) {
      return err(
        noSolution('The level is already below the limit by the margin: no filter is needed.', 'measured'),
      )
    }
    const { asymptotic, exact } = cornerFor(attenuation, frequency)
    const product = 1 / (2 * Math.PI * exact) ** 2
    const isSteep = attenuation >= 20
    return ok({
      results: [
        main('attenuation', 'Needed attenuation', 'A', 'dB', attenuation),
        main('corner', 'Corner of one LC stage', 'f_c', 'Hz', exact),
        step('asymptoticCorner', 'Corner by the asymptote', 'f_c', 'Hz', asymptotic),
        // Henries times farads are seconds squared; its root is what has a name.
        step('timeConstant', 'Time constant of the stage', '√(L C)', 's', Math.sqrt(product)),
        ...(inductance === undefined
          ? []
          : [main('capacitance', 'Capacitance for this inductance', 'C', 'F', product / inductance)]),
      ],
      choices: [],
      validity: [
        {
          passed: isSteep,
          sentence: isSteep
            ? 'The corner is far enough below the frequency for the slope of 40 dB a decade.'
            : 'Less than 20 dB are needed: the corner lies close to the frequency, and damping and loads change the attenuation.',
        },
      ],
      figures: [],
    })
  },
})
