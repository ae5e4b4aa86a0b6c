import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { nearestByDifference, nearestByRatio, neighboursOf, seriesNames } from './preferred-values'

/** A value among the preferred numbers. */
export const preferredValue = defineMethod({
  id: 'preferred-value',
  version: 1,
  title: 'Preferred values',
  purpose: 'Finds the standard part values around a computed one, in every series.',
  inputs: {
    value: {
      label: 'Value',
      symbol: 'v',
      unit: '',
      help: 'In any unit: a number with its prefix left out',
      isRequired: true,
      atLeast: 1e-18,
      atMost: 1e18,
    },
  },
  formulas: [
    'nearest by ratio: least |ln(x/v)|;   nearest by difference: least |x − v|',
    'E48, E96, E192: 10^(i/n) rounded to three digits, but 9.20 for 9.19; E3 to E24 by the table',
  ],
  notes: [
    'The two meanings of “nearest” differ in a narrow zone, as at 1.049 in E24. Parts have tolerances in per cent, so by ratio is the one that the other methods use.',
  ],
  cautions: [],
  sources: [
    {
      citation: 'IEC 60063, Preferred number series for resistors and capacitors (tables from memory)',
      standing: 'published',
    },
  ],
  example: { value: '4.93' },
  compute: ({ value }) =>
    ok({
      results: [
        main('e24', 'Nearest of E24 by ratio', 'E24', '', nearestByRatio(value, 'E24')),
        main('e96', 'Nearest of E96 by ratio', 'E96', '', nearestByRatio(value, 'E96')),
        step('deviation', 'E24 off by', 'x/v − 1', '%', 100 * (nearestByRatio(value, 'E24') / value - 1)),
      ],
      choices: [
        {
          title: 'In every series',
          columns: [
            { label: 'Series', unit: 'text' },
            { label: 'Next below', unit: '' },
            { label: 'Next above', unit: '' },
            { label: 'Nearest by ratio', unit: '' },
            { label: 'Nearest by difference', unit: '' },
          ],
          rows: seriesNames.map((series) => {
            const { below, above } = neighboursOf(value, series)
            return [series, below, above, nearestByRatio(value, series), nearestByDifference(value, series)]
          }),
        },
      ],
      validity: [],
      figures: [],
    }),
})
