import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'

const needed = { isRequired: true, atLeast: 1e-18, atMost: 1e9 } as const

/** Voltage over an inductance while its current changes. */
export const loopVoltage = defineMethod({
  id: 'loop-voltage',
  version: 1,
  title: 'Voltage over a loop inductance',
  purpose: 'Gives the voltage that a changing current makes over the inductance of its loop.',
  inputs: {
    inductance: { label: 'Inductance', symbol: 'L', unit: 'H', help: 'Of the loop', ...needed },
    change: { label: 'Change of current', symbol: 'ΔI', unit: 'A', help: 'Within the time below', ...needed },
    time: { label: 'Time', symbol: 'Δt', unit: 's', help: 'In which the current changes', ...needed },
  },
  formulas: ['V = L ΔI/Δt'],
  notes: [
    'This is the voltage of the whole loop. How it divides among its parts is a matter of partial inductances.',
  ],
  cautions: ['The voltage adds to the supply at the switch: keep its rating above the sum, with margin.'],
  sources: [{ citation: 'Law of induction', standing: 'published' }],
  example: { inductance: '8 nH', change: '12 A', time: '6 ns' },
  compute: ({ inductance, change, time }) =>
    ok({
      results: [
        main('voltage', 'Voltage', 'V', 'V', (inductance * change) / time),
        step('energy', 'Energy of the current', '½ L ΔI²', 'J', (inductance * change ** 2) / 2),
      ],
      choices: [],
      validity: [],
      figures: [],
    }),
})
