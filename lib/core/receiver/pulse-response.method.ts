import type { Figure } from '../figure/figure'
import { defineMethod, noSolution, type ChoiceTable } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { levelOfPeak } from '../spectrum/level'
import { receiverBands, type ReceiverBand } from './bands'
import { meanOf, peakOf } from './envelope-cycle'
import { coupledStagesBandwidths } from './filter-bandwidths'
import { pulseEnvelope } from './pulse-envelope'
import { pulseResponse } from './pulse-response'
import { pulseResponseTexts } from './pulse-response.texts'
import { publishedPulseResponse } from './published-pulse-response'

/** What a receiver reads of repeated short pulses: peak, quasi-peak and average. */
export const receiverPulseResponse = defineMethod({
  id: 'receiver-pulse-response',
  version: 1,
  ...pulseResponseTexts,
  inputs: {
    band: {
      kind: 'choice',
      label: 'Band',
      symbol: 'B₆',
      help: 'By the frequency to which the receiver is tuned',
      isRequired: true,
      options: {
        A: 'A: 9 to 150 kHz, RBW 200 Hz',
        B: 'B: 0.15 to 30 MHz, RBW 9 kHz',
        C: 'C: 30 to 300 MHz, RBW 120 kHz',
        D: 'D: 300 MHz to 1 GHz, RBW 120 kHz',
      },
    },
    area: {
      label: 'Pulse area',
      symbol: 'S',
      unit: 'V·s',
      help: 'Height times duration of one pulse at the receiver',
      isRequired: true,
      above: 1e-15,
      atMost: 1,
    },
    rate: {
      label: 'Pulse rate',
      symbol: 'PRF',
      unit: 'Hz',
      help: 'Pulses per second; empty for a single pulse',
      isRequired: false,
      atLeast: 0.01,
      atMost: 1e8,
    },
  },
  compute: ({ band: id, area, rate }) => {
    const band = receiverBands[id]
    const readings = pulseResponse(band, { area, rate: rate ?? null })
    if (!readings.ok) return err(noSolution(readings.error.message, 'rate', 'area'))
    const { peak, quasiPeak, average, relative } = readings.value
    const { impulse, noise, width3dB } = coupledStagesBandwidths(band.bandwidth)
    const isPublished = rate === undefined || rate >= 1
    const isApart = rate === undefined || rate < band.bandwidth / 10
    return ok({
      results: [
        main('quasiPeak', 'Quasi-peak reading', 'QP', 'dBµV', quasiPeak),
        ...quickResults(band, area, rate),
        step('belowPeak', 'Peak over quasi-peak', 'PK − QP', 'dB', peak - quasiPeak),
        ...(average === null
          ? []
          : [step('overAverage', 'Quasi-peak over average', 'QP − AV', 'dB', quasiPeak - average)]),
        step('relative', 'Over the reading at the reference rate', '', 'dB', relative),
        step('impulse', 'Impulse bandwidth', 'B_imp', 'Hz', impulse),
        step('noise', 'Noise bandwidth', 'B_n', 'Hz', noise),
        step('width3dB', 'Width at −3 dB', 'B₃', 'Hz', width3dB),
      ],
      choices: [comparison(band)],
      validity: [
        {
          passed: isApart,
          sentence: isApart
            ? 'The pulses answer singly; the readings do not depend on the exact tuning.'
            : 'The pulse rate comes near the bandwidth: the readings hold for a receiver tuned to a harmonic of the rate, and fall between harmonics.',
        },
        {
          passed: isPublished,
          sentence: isPublished
            ? 'The published response covers such pulses.'
            : 'Between single pulses and 1 per second the published response has no value to compare with.',
        },
      ],
      figures: [responseFigure(band)],
    })
  },
  computeResults: ({ band, area, rate }) => ok(quickResults(receiverBands[band], area, rate)),
})

/** Those that need no simulation. */
function quickResults(band: ReceiverBand, area: number, rate: number | undefined) {
  const cycle = pulseEnvelope(area, band.bandwidth, rate ?? 0)
  const peak = main('peak', 'Peak reading', 'PK', 'dBµV', levelOfPeak(peakOf(cycle)))
  if (rate === undefined) return [peak]
  return [peak, main('average', 'Average reading', 'AV', 'dBµV', levelOfPeak(meanOf(cycle)))]
}

/** Quasi-peak at a rate over that at the reference rate; the rates asked here are all within range. */
const relativeAt = (band: ReceiverBand, rate: number | null): number => {
  const readings = pulseResponse(band, { area: 1e-6, rate })
  return readings.ok ? readings.value.relative : 0
}

const comparison = (band: ReceiverBand): ChoiceTable => ({
  title: 'Quasi-peak reading over that at the reference rate, and the published one (from memory)',
  columns: [
    { label: 'Pulses per second', unit: 'text' },
    { label: 'Computed', unit: 'dB' },
    { label: 'Published', unit: 'dB' },
  ],
  rows: (publishedPulseResponse[band.id] ?? []).map(([rate, level]) => [
    rate === null ? 'single pulse' : String(rate),
    relativeAt(band, rate),
    0 - level,
  ]),
})

function responseFigure(band: ReceiverBand): Figure {
  const x = Array.from({ length: 13 }, (_, index) => 10 ** (index / 4))
  const published = (publishedPulseResponse[band.id] ?? []).flatMap(([rate, level]) =>
    rate === null ? [] : [{ rate, level: 0 - level }],
  )
  const sorted = published.toSorted((a, b) => a.rate - b.rate)
  return {
    id: 'quasi-peak-response',
    title: 'Quasi-peak reading of pulses of constant size',
    description: `Reading in band ${band.id} over the one at ${band.referenceRate ?? 0} pulses per second: it falls as the pulses get rarer.`,
    x: { label: 'Pulses per second', unit: 'Hz', scale: 'log' },
    y: { label: 'Relative reading', unit: 'dB', scale: 'linear' },
    series: [
      { id: 'computed', label: 'Computed', role: 'computed', x, y: x.map((rate) => relativeAt(band, rate)) },
      {
        id: 'published',
        label: 'Published, from memory',
        role: 'reference',
        x: sorted.map(({ rate }) => rate),
        y: sorted.map(({ level }) => level),
      },
    ],
    marks: [],
  }
}
