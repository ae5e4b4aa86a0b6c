import type { Figure } from '../figure/figure'
import { defineMethod, noSolution, type ChoiceTable, type ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { carsonWidth, evenSpreadReduction, type SpreadLine } from '../spectrum/spread-spectrum'
import { receiverBandAt, type ReceiverBand } from './bands'
import { coupledStagesBandwidths } from './filter-bandwidths'
import { isWithinReach, spreadReduction, type SpreadReduction } from './spread-reduction'
import { spreadSpectrumTexts } from './spread-spectrum.texts'

/** What spreading a switching frequency gains at a harmonic, by detector. */
export const spreadSpectrumEffect = defineMethod({
  id: 'spread-spectrum-effect',
  version: 1,
  ...spreadSpectrumTexts,
  inputs: {
    frequency: {
      label: 'Frequency of the source',
      symbol: 'f₀',
      unit: 'Hz',
      help: 'In the middle of the sweep',
      isRequired: true,
      atLeast: 9e3,
      atMost: 10e9,
    },
    spread: {
      label: 'Spread',
      symbol: 'Δ',
      unit: '%',
      help: 'From lowest to highest frequency: ±2 % is 4 %',
      isRequired: true,
      above: 0,
      atMost: 50,
    },
    rate: {
      label: 'Modulation rate',
      symbol: 'f_m',
      unit: 'Hz',
      help: 'Sweeps up and down per second',
      isRequired: true,
      atLeast: 100,
      atMost: 10e6,
    },
    profile: {
      kind: 'choice',
      label: 'Profile',
      symbol: 'f(t)',
      help: 'How the frequency runs over time',
      isRequired: true,
      options: { triangle: 'Triangle', sine: 'Sine' },
    },
    harmonic: {
      label: 'Harmonic',
      symbol: 'h',
      unit: '',
      help: 'A whole number',
      isRequired: true,
      atLeast: 1,
      atMost: 1e5,
    },
  },
  compute: (values) => {
    const { harmonic, frequency } = values
    if (!Number.isInteger(harmonic)) return err(noSolution('A harmonic has a whole number.', 'harmonic'))
    const band = receiverBandAt(harmonic * frequency)
    if (band === null) {
      return err(
        noSolution('The harmonic lies outside the bands of the receiver, 9 kHz to 18 GHz.', 'harmonic'),
      )
    }
    const line = lineAt(values, harmonic)
    if (!isWithinReach(line, band)) {
      const message =
        'The modulation is so slow against sweep and bandwidth that it has too many lines to work out.'
      return err(noSolution(message, 'rate'))
    }
    const reduction = spreadReduction(line, band)
    const rows = overHarmonics(values)
    return ok({
      results: [
        ...detectorResults(reduction),
        ...quickResults(line, band),
        step('bandwidth', 'Bandwidth of the receiver', 'B₆', 'Hz', band.bandwidth),
        step(
          'firstHelped',
          'First harmonic wider than this bandwidth',
          'B₆/(Δ f₀)',
          '',
          Math.ceil(band.bandwidth / (line.width / harmonic)),
        ),
      ],
      choices: [harmonicTable(rows)],
      validity: validityOf(line, band, reduction.peak),
      figures: rows.length > 1 ? [harmonicFigure(rows)] : [],
    })
  },
  computeResults: (values) => {
    const band = receiverBandAt(values.harmonic * values.frequency)
    return ok(band === null ? [] : quickResults(lineAt(values, values.harmonic), band))
  },
})

type Values = {
  readonly frequency: number
  readonly spread: number
  readonly rate: number
  readonly profile: SpreadLine['profile']
}

const lineAt = ({ frequency, spread, rate, profile }: Values, harmonic: number): SpreadLine => ({
  width: (harmonic * frequency * spread) / 100,
  rate,
  profile,
})

const detectorResults = ({ peak, quasiPeak, average }: SpreadReduction) => [
  main('peak', 'Peak reading falls by', 'PK', 'dB', peak),
  ...(quasiPeak === null ? [] : [main('quasiPeak', 'Quasi-peak reading falls by', 'QP', 'dB', quasiPeak)]),
  main('average', 'Average reading falls by', 'AV', 'dB', average),
]

/** Those that need no simulation. */
function quickResults(line: SpreadLine, band: ReceiverBand) {
  const even = evenSpreadReduction(line, coupledStagesBandwidths(band.bandwidth).noise)
  return [
    step('even', 'Power evenly spread over the sweep', '10 lg(W/max(B_n, f_m))', 'dB', even),
    step('width', 'Sweep of the harmonic', 'W = h Δ f₀', 'Hz', line.width),
    step('carson', 'Width with 98 % of the power', 'W + 2f_m', 'Hz', carsonWidth(line)),
  ]
}

type Row = { readonly harmonic: number; readonly frequency: number } & SpreadReduction

function overHarmonics(values: Values): readonly Row[] {
  return [1, 2, 5, 10, 20, 50, 100, 200].flatMap((harmonic) => {
    const frequency = harmonic * values.frequency
    const band = receiverBandAt(frequency)
    const line = lineAt(values, harmonic)
    if (band === null || frequency > 1e9 || !isWithinReach(line, band)) return []
    return [{ harmonic, frequency, ...spreadReduction(line, band) }]
  })
}

const harmonicTable = (rows: readonly Row[]): ChoiceTable => ({
  title: 'Reduction over the harmonics up to 1 GHz',
  columns: [
    { label: 'h', unit: '' },
    { label: 'Frequency', unit: 'Hz' },
    { label: 'Peak', unit: 'dB' },
    { label: 'Quasi-peak', unit: 'dB' },
    { label: 'Average', unit: 'dB' },
  ],
  rows: rows.map(({ harmonic, frequency, peak, quasiPeak, average }) => [
    harmonic,
    frequency,
    peak,
    quasiPeak ?? peak,
    average,
  ]),
})

function harmonicFigure(rows: readonly Row[]): Figure {
  const x = rows.map(({ frequency }) => frequency)
  return {
    id: 'spread-reduction',
    title: 'Reduction over the harmonics',
    description: 'How much lower peak, quasi-peak and average read with the modulation than without.',
    x: { label: 'Frequency', unit: 'Hz', scale: 'log' },
    y: { label: 'Reduction', unit: 'dB', scale: 'linear' },
    series: [
      { id: 'peak', label: 'Peak', role: 'computed', x, y: rows.map(({ peak }) => peak) },
      { id: 'average', label: 'Average', role: 'reference', x, y: rows.map(({ average }) => average) },
    ],
    marks: [],
  }
}

function validityOf(line: SpreadLine, { bandwidth }: ReceiverBand, peak: number): readonly ValidityCheck[] {
  const isWide = line.width > bandwidth
  const even = evenSpreadReduction(line, coupledStagesBandwidths(bandwidth).noise)
  const isShared = peak >= even / 2
  return [
    {
      passed: isWide,
      sentence: isWide
        ? 'The harmonic is swept over more than the bandwidth of the receiver.'
        : 'The sweep of this harmonic stays within the bandwidth of the receiver: spreading gains nothing here.',
    },
    {
      passed: isShared,
      sentence: isShared
        ? 'The sweep is fast enough that a peak detector, too, gains most of what the spread power promises.'
        : 'The sweep passes the filter at nearly its full height: peak and quasi-peak gain far less than the spread power promises.',
    },
  ]
}
