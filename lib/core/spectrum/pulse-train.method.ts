import { defineMethod, noSolution } from '../method/method'
import type { ChoiceTable, MethodError, ResultValue } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok, type Result } from '../result'
import { levelOfPeak } from './level'
import { envelopeAt, envelopeOf, harmonicPeak, type PulseTrain } from './pulse-train'
import { spectrumFigure } from './pulse-train-figure'
import { pulseTrainTexts } from './pulse-train.texts'

const edge = { unit: 's', isRequired: true, above: 0, atMost: 1 } as const

/** Harmonics of a switched voltage and the envelope over them. */
export const pulseTrainSpectrum = defineMethod({
  id: 'pulse-train-spectrum',
  version: 1,
  ...pulseTrainTexts,
  inputs: {
    amplitude: {
      label: 'Amplitude',
      symbol: 'A',
      unit: 'V',
      help: 'From low to high',
      isRequired: true,
      above: 0,
      atMost: 1e6,
    },
    frequency: {
      label: 'Repetition frequency',
      symbol: 'f',
      unit: 'Hz',
      help: 'Pulses per second',
      isRequired: true,
      above: 0,
      atMost: 1e12,
    },
    width: {
      label: 'Pulse width',
      symbol: 'τ',
      help: 'Between the points at half of the amplitude',
      ...edge,
    },
    rise: {
      label: 'Rising edge',
      symbol: 't_r',
      help: '0 to 100 %: the 10 to 90 % time divided by 0.8',
      ...edge,
    },
    fall: {
      label: 'Falling edge',
      symbol: 't_f',
      help: '0 to 100 %: the 90 to 10 % time divided by 0.8',
      ...edge,
    },
    harmonic: {
      label: 'Harmonic',
      symbol: 'n',
      unit: '',
      help: 'A whole number; left empty, the first fifteen are in the table',
      isRequired: false,
      atLeast: 1,
      atMost: 1e6,
    },
  },
  example: { amplitude: '5 V', frequency: '10 MHz', width: '40 ns', rise: '2 ns', fall: '2 ns' },
  compute: (values) => {
    const results = resultsOf(values)
    if (!results.ok) return results
    const train = trainOf(values)
    return ok({
      results: results.value,
      choices: [harmonicTable(train)],
      validity: [
        {
          passed: true,
          sentence:
            'The pulses are straight-edged and all alike: ringing, jitter and modulation are not included.',
        },
      ],
      figures: [spectrumFigure(train)],
    })
  },
  computeResults: resultsOf,
})

type Values = Omit<PulseTrain, 'period'> & {
  readonly frequency: number
  readonly harmonic: number | undefined
}

const trainOf = ({ amplitude, frequency, width, rise, fall }: Values): PulseTrain => ({
  amplitude,
  period: 1 / frequency,
  width,
  rise,
  fall,
})

function resultsOf(values: Values): Result<readonly ResultValue[], MethodError> {
  const train = trainOf(values)
  const { harmonic } = values
  const half = (train.rise + train.fall) / 2
  if (half > train.width || half > train.period - train.width) {
    const message =
      'The edges do not fit: half of both together must be no longer than the pulse and than the pause.'
    return err(noSolution(message, 'width', 'rise', 'fall'))
  }
  if (harmonic === undefined) return ok(envelopeResults(train))
  if (!Number.isInteger(harmonic)) return err(noSolution('A harmonic has a whole number.', 'harmonic'))
  return ok([...harmonicResults(train, harmonic), ...envelopeResults(train)])
}

const harmonicTable = (train: PulseTrain): ChoiceTable => ({
  title: 'The first harmonics',
  columns: [
    { label: 'n', unit: '' },
    { label: 'Frequency', unit: 'Hz' },
    { label: 'Peak value', unit: 'V' },
    { label: 'Envelope', unit: 'V' },
  ],
  rows: Array.from({ length: 15 }, (_, index) => rowOf(train, index + 1)),
})

function envelopeResults(train: PulseTrain): readonly ResultValue[] {
  const envelope = envelopeOf(train)
  const fastest = Math.min(train.rise, train.fall)
  return [
    main('fundamental', 'Fundamental, peak value', 'Û₁', 'V', harmonicPeak(train, 1)),
    main('firstCorner', 'First corner of the envelope', '1/(πτ)', 'Hz', envelope.firstCorner),
    main('secondCorner', 'Second corner of the envelope', '1/(πt)', 'Hz', envelope.secondCorner),
    step('plateau', 'Plateau of the envelope, peak value', '2Aτ/T', 'V', envelope.plateau),
    step('plateauLevel', 'Plateau of the envelope', '2Aτ/T', 'dBµV', levelOfPeak(envelope.plateau)),
    step('dutyCycle', 'Duty cycle', 'τ/T', '', train.width / train.period),
    step('edge1090', 'Faster edge, 10 to 90 %', '0.8 t', 's', 0.8 * fastest),
    step('bandwidth', 'Bandwidth by 0.35/t(10–90)', '0.35/t', 'Hz', 0.35 / (0.8 * fastest)),
    step('knee', 'Knee frequency by 0.5/t(10–90)', '0.5/t', 'Hz', 0.5 / (0.8 * fastest)),
  ]
}

function harmonicResults(train: PulseTrain, n: number): readonly ResultValue[] {
  const peak = harmonicPeak(train, n)
  const limit = envelopeAt(envelopeOf(train), n / train.period)
  return [
    main('harmonicPeak', `Harmonic ${n}, peak value`, 'Û_n', 'V', peak),
    // A null has no level in decibels.
    ...(peak > 0 ? [main('harmonicLevel', `Harmonic ${n}`, 'L_n', 'dBµV', levelOfPeak(peak))] : []),
    step('harmonicFrequency', `Frequency of harmonic ${n}`, 'n f', 'Hz', n / train.period),
    step('envelopeLevel', `Envelope at harmonic ${n}`, 'L_env', 'dBµV', levelOfPeak(limit)),
  ]
}

function rowOf(train: PulseTrain, n: number): readonly number[] {
  const frequency = n / train.period
  return [n, frequency, harmonicPeak(train, n), envelopeAt(envelopeOf(train), frequency)]
}
