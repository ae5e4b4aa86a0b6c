import type { Figure, Mark } from '../figure/figure'
import { quantityText } from '../units/format-quantity'
import { levelOfPeak } from './level'
import { envelopeAt, envelopeOf, harmonicPeak, type PulseTrain } from './pulse-train'

const mostHarmonics = 400

/** Nulls are drawn so far below the envelope, in dB. */
const floor = 60

/** Levels of the harmonics and of their envelope, from the fundamental to ten times the second corner. */
export function spectrumFigure(train: PulseTrain): Figure {
  const envelope = envelopeOf(train)
  const count = Math.min(mostHarmonics, Math.max(10, Math.ceil(10 * envelope.secondCorner * train.period)))
  const x = Array.from({ length: count }, (_, index) => (index + 1) / train.period)
  const limit = x.map((frequency) => levelOfPeak(envelopeAt(envelope, frequency)))
  const levels = limit.map((top, index) => {
    const peak = harmonicPeak(train, index + 1)
    return peak > 0 ? Math.max(levelOfPeak(peak), top - floor) : top - floor
  })
  const fundamental = quantityText(levels[0] ?? 0, 'dBµV')
  return {
    id: 'pulse-train-spectrum',
    title: 'Harmonics of the pulse train and their envelope',
    description: `Levels of ${count} harmonics; the fundamental has ${fundamental}, and all lie below the envelope.`,
    x: { label: 'Frequency', unit: 'Hz', scale: 'log' },
    y: { label: 'Level', unit: 'dBµV', scale: 'linear' },
    series: [
      { id: 'envelope', label: 'Envelope', role: 'reference', x, y: limit },
      { id: 'harmonics', label: 'Harmonics', role: 'computed', x, y: levels },
    ],
    marks: [corner(envelope.firstCorner, '1/(πτ)', x), corner(envelope.secondCorner, '1/(πt)', x)].flat(),
  }
}

const corner = (at: number, label: string, x: readonly number[]): readonly Mark[] =>
  at >= (x[0] ?? 0) && at <= (x.at(-1) ?? 0) ? [{ kind: 'instant', x: at, label }] : []
