import type { Figure } from '../figure/figure'
import { defineMethod, noSolution, type ChoiceTable, type ResultValue } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { cosineWindows, type CosineWindow } from './cosine-window'
import { windowFigures, windowResponse, type WindowFigures } from './window-response'

const options = Object.fromEntries(cosineWindows.map(({ id, name }) => [id, name]))

/** What a window makes of a sampled record: resolution bandwidth, reading errors, and the record length for a wanted RBW. */
export const spectralWindow = defineMethod({
  id: 'spectral-window',
  version: 1,
  title: 'Window and resolution of a spectrum',
  purpose: 'Gives the resolution bandwidth and the level error of a windowed spectrum of a sampled record.',
  inputs: {
    window: { kind: 'choice', label: 'Window', symbol: 'w', help: 'By its terms', isRequired: true, options },
    sampleRate: {
      label: 'Sample rate',
      symbol: 'f_s',
      unit: 'Hz',
      help: 'Values per second',
      isRequired: true,
      above: 0,
      atMost: 1e13,
    },
    count: {
      label: 'Record length',
      symbol: 'N',
      unit: '',
      help: 'Number of values',
      isRequired: true,
      atLeast: 16,
      atMost: 1e9,
    },
    wanted: {
      label: 'Wanted resolution bandwidth',
      symbol: 'RBW',
      unit: 'Hz',
      help: 'Such as 9 kHz or 120 kHz; may be left empty',
      isRequired: false,
      above: 0,
      atMost: 1e12,
    },
  },
  formulas: [
    'w[n] = Σ (−1)^k a_k cos(2πkn/N)',
    'ENBW = (a₀² + ½ Σ a_k²)/a₀² bins,   bin = f_s/N',
    'Amplitude = 2|X|/Σw,   scallop loss = −20 lg [Σ a_k/2 (sinc(½ − k) + sinc(½ + k))/a₀]',
  ],
  notes: [
    'Names of windows are ambiguous: “flat top” means three terms on some oscilloscopes and five in most numerical libraries, “Blackman-Harris” three terms (67 dB) or four (92 dB). Their ENBW differs by a quarter; go by the coefficients.',
    'A record that holds whole periods of everything in it needs no window. Any other one does.',
    'The level of a tone does not depend on the resolution bandwidth; that of noise rises by 10 lg, that of short pulses by 20 lg of it.',
  ],
  cautions: [],
  sources: [
    {
      citation:
        'F. J. Harris, “On the use of windows for harmonic analysis with the DFT”, Proc. IEEE 66(1), 1978, 51-83 (from memory)',
      standing: 'published',
    },
  ],
  example: { window: 'flat-top-5', sampleRate: '1 GHz', count: '1000000', wanted: '9 kHz' },
  compute: (values) => {
    const offer = offers.find(({ window }) => window.id === values.window)
    if (!offer) return err(noSolution('There is no such window.', 'window'))
    const { sampleRate, count, wanted } = values
    const isEnough = wanted === undefined || (offer.figures.noiseBandwidth * sampleRate) / count <= wanted
    return ok({
      results: resultsOf(values, offer.figures),
      choices: [windowTable()],
      validity: [
        {
          passed: isEnough,
          sentence: isEnough
            ? 'The record is long enough for the resolution bandwidth.'
            : 'The record is too short for the wanted resolution bandwidth: neighbouring lines run together.',
        },
      ],
      figures: [responseFigure(offer.window)],
    })
  },
  computeResults: (values) => {
    const offer = offers.find(({ window }) => window.id === values.window)
    return offer
      ? ok(resultsOf(values, offer.figures))
      : err(noSolution('There is no such window.', 'window'))
  },
})

const offers = cosineWindows.flatMap((window) => {
  const figures = windowFigures(window.coefficients)
  return figures ? [{ window, figures }] : []
})

type Values = { readonly sampleRate: number; readonly count: number; readonly wanted: number | undefined }

function resultsOf({ sampleRate, count, wanted }: Values, figures: WindowFigures): readonly ResultValue[] {
  const bin = sampleRate / count
  const needed = wanted === undefined ? undefined : figures.noiseBandwidth / wanted
  return [
    main('resolution', 'Resolution bandwidth', 'ENBW', 'Hz', figures.noiseBandwidth * bin),
    main('scallop', 'Greatest error of a level between bins', 'a_s', 'dB', figures.scallopLoss),
    ...(needed === undefined ? [] : [main('duration', 'Record length for the wanted RBW', 'T', 's', needed)]),
    step('bin', 'Width of a bin', 'f_s/N', 'Hz', bin),
    step('recorded', 'Length of this record', 'N/f_s', 's', count / sampleRate),
    step('width6dB', 'Width at −6 dB', 'B₆', 'Hz', figures.width6dB * bin),
    step('width3dB', 'Width at −3 dB', 'B₃', 'Hz', figures.width3dB * bin),
    step('gain', 'Coherent gain', 'a₀', '', figures.coherentGain),
  ]
}

const windowTable = (): ChoiceTable => ({
  title: 'All windows, in bins',
  columns: [
    { label: 'Window', unit: 'text' },
    { label: 'Coherent gain', unit: '' },
    { label: 'ENBW', unit: '' },
    { label: 'Scallop loss', unit: 'dB' },
    { label: 'B₃', unit: '' },
    { label: 'B₆', unit: '' },
  ],
  rows: offers.map(({ window, figures }) => [
    window.name,
    figures.coherentGain,
    figures.noiseBandwidth,
    figures.scallopLoss,
    figures.width3dB,
    figures.width6dB,
  ]),
})

/** Levels below this are drawn at it, in dB. */
const floor = -120

function responseFigure({ name, coefficients }: CosineWindow): Figure {
  const x = Array.from({ length: 801 }, (_, index) => (index - 400) / 40)
  const y = x.map((bins) => {
    const response = Math.abs(windowResponse(coefficients, bins))
    return response > 0 ? Math.max(floor, 20 * Math.log10(response)) : floor
  })
  return {
    id: 'window-response',
    title: 'What one tone leaves in the bins around it',
    description: `Response of the window “${name}” over ten bins on either side.`,
    x: { label: 'Distance from the tone in bins', unit: '', scale: 'linear' },
    y: { label: 'Response', unit: 'dB', scale: 'linear' },
    series: [{ id: 'response', label: name, role: 'computed', x, y }],
    marks: [],
  }
}
