import type { InputValues } from '../method/input-definition'
import {
  defineMethod,
  noSolution,
  type ChoiceTable,
  type MethodError,
  type ResultValue,
} from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok, type Result } from '../result'
import { derivedHere, lengthInput, loopCautions } from './inductance-inputs'
import { viaArray, type ViaArrayInductance } from './via-array'

const coordinate = { unit: 'm', atLeast: -1e3, atMost: 1e3 } as const

const inputs = {
  positions: {
    kind: 'table',
    label: 'Positions of the vias',
    symbol: 'P',
    help: 'The middle of each',
    isRequired: true,
    columns: {
      x: { label: 'x', symbol: 'x', ...coordinate },
      y: { label: 'y', symbol: 'y', ...coordinate },
    },
    leastRows: 1,
    mostRows: 100,
  },
  length: lengthInput('Length', 'h', 'Between the conductors that the vias join', true),
  diameter: lengthInput('Diameter', 'd', 'Of each barrel', true),
} as const

type Values = InputValues<typeof inputs>

/** Partial inductance of vias in parallel, and how they share the current. */
export const viaArrayInductance = defineMethod({
  id: 'via-array-inductance',
  version: 1,
  title: 'Inductance of vias in parallel',
  purpose:
    'Gives the partial inductance of several vias that join the same conductors, and the current in each.',
  inputs,
  formulas: [
    'L = 1/(1ᵀ 𝓛⁻¹ 1): the same voltage along every via',
    '𝓛: on the diagonal the exact tube, elsewhere M = (µ₀/2π)[h asinh(h/s) − √(h² + s²) + s]',
    'Share of a via: its row of 𝓛⁻¹ 1 over the sum of all',
  ],
  notes: [
    'Vias side by side share their field: nine vias in a grid of 1 mm, 1.6 mm long, have 2.8 times a ninth of the inductance of one.',
    'The current crowds to the outer vias; those in the middle of a field do little. Spread vias out instead of packing them.',
    'The return is taken as far away. A return via between the others does more than another via in parallel.',
  ],
  cautions: loopCautions,
  sources: [
    {
      citation:
        'A. E. Ruehli, Inductance Calculations in a Complex Integrated Circuit Environment, IBM J. Res. Dev. 16, 1972, p. 470',
      standing: 'published',
    },
    derivedHere,
  ],
  example: {
    positions: '0, 0\n1 mm, 0\n2 mm, 0\n0, 1 mm\n1 mm, 1 mm\n2 mm, 1 mm',
    length: '1.6 mm',
    diameter: '0.3 mm',
  },
  compute: (values) => {
    const answer = answerTo(values)
    if (!answer.ok) return answer
    const nearest = nearestSpacing(values)
    const isLoose = nearest >= 3 * values.diameter
    return ok({
      results: resultsOf(answer.value, values.positions.length),
      choices: [sharesTable(values, answer.value)],
      validity: [
        {
          passed: isLoose,
          sentence: isLoose
            ? 'The vias are at least three diameters apart: good to about 0.3 %.'
            : 'Some vias are nearer than three diameters: the current is no longer even around their barrels, which leaves about a per cent open.',
        },
      ],
      figures: [],
    })
  },
  computeResults: (values) => {
    const answer = answerTo(values)
    return answer.ok ? ok(resultsOf(answer.value, values.positions.length)) : answer
  },
})

function answerTo({ positions, length, diameter }: Values): Result<ViaArrayInductance, MethodError> {
  const answer = viaArray({ length, diameter, positions: positions.map(({ x, y }) => [x, y] as const) })
  return answer.ok ? answer : err(noSolution(answer.error.message, 'positions', 'diameter'))
}

const resultsOf = (answer: ViaArrayInductance, count: number): readonly ResultValue[] => [
  main('inductance', 'Inductance of all vias', 'L', 'H', answer.effective),
  step('single', 'One via alone', 'L₁', 'H', answer.single),
  step('share', 'One via divided by their number', 'L₁/n', 'H', answer.single / count),
  step('ratio', 'How many times more it is', 'n L/L₁', '', answer.ratioToShare),
  step('largestShare', 'Largest share of the current', 'i', '%', 100 * Math.max(...answer.shares)),
  step('smallestShare', 'Smallest share of the current', 'i', '%', 100 * Math.min(...answer.shares)),
]

const sharesTable = ({ positions }: Values, { shares }: ViaArrayInductance): ChoiceTable => ({
  title: 'Current of each via',
  columns: [
    { label: 'Via', unit: '' },
    { label: 'x', unit: 'm' },
    { label: 'y', unit: 'm' },
    { label: 'Share of the current', unit: '%' },
  ],
  rows: positions.map(({ x, y }, index) => [index + 1, x, y, 100 * (shares[index] ?? 0)]),
})

function nearestSpacing({ positions }: Values): number {
  const distances = positions.flatMap((a, i) =>
    positions.slice(0, i).map((b) => Math.hypot(a.x - b.x, a.y - b.y)),
  )
  return Math.min(Number.POSITIVE_INFINITY, ...distances)
}
