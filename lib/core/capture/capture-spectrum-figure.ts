import type { Figure } from '../figure/figure'
import { levelOfPeak } from '../spectrum/level'
import { quantityText } from '../units/format-quantity'
import type { CaptureSpectrum } from './capture-spectrum'

/** Columns of the plot; in each the highest bin is drawn, so that no line is lost. */
const columns = 800

/** The strongest sines are written beside their peaks. */
const written = 4

/** Nothing is drawn so far below the floor of the noise, in dB. */
const belowFloor = 20

/** Levels over frequency, from two bins on, with the strongest sines and the floor of the noise. */
export function captureSpectrumFigure({ spectrum, tones, floorLevel }: CaptureSpectrum): Figure {
  const { x, y } = highestOfColumns(spectrum.amplitudes, spectrum.binWidth, floorLevel - belowFloor)
  const [strongest] = tones
  const bandwidth = quantityText(spectrum.resolutionBandwidth, 'Hz', 3)
  return {
    id: 'capture-spectrum',
    title: 'Spectrum of the capture',
    description: describe(tones.length, strongest, bandwidth),
    x: { label: 'Frequency', unit: 'Hz', scale: 'log' },
    y: { label: 'Level', unit: 'dBµV', scale: 'linear' },
    series: [{ id: 'levels', label: `RBW ${bandwidth}, ${spectrum.window.name}`, role: 'measured', x, y }],
    marks: [
      { kind: 'level', y: floorLevel, label: 'least sine above the noise' },
      ...tones.slice(0, written).map(({ frequency, level }) => ({
        kind: 'point' as const,
        x: frequency,
        y: level,
        label: quantityText(frequency, 'Hz'),
      })),
    ],
  }
}

function describe(
  count: number,
  strongest: { frequency: number; level: number } | undefined,
  bandwidth: string,
): string {
  const most =
    strongest === undefined
      ? ''
      : ` The strongest lies at ${quantityText(strongest.frequency, 'Hz')} with ${quantityText(strongest.level, 'dBµV')}.`
  return `Lines above the noise: ${count}, in a resolution bandwidth of ${bandwidth}.${most}`
}

function highestOfColumns(
  amplitudes: Float64Array,
  binWidth: number,
  lowest: number,
): { readonly x: readonly number[]; readonly y: readonly number[] } {
  const first = 2
  const last = amplitudes.length - 1
  const x: number[] = []
  const y: number[] = []
  let bin = first
  for (let column = 1; column <= columns && bin <= last; column += 1) {
    const end = Math.min(last, Math.floor(first * (last / first) ** (column / columns)))
    let best = bin
    if (end < bin) continue
    for (; bin <= end; bin += 1) if ((amplitudes[bin] ?? 0) > (amplitudes[best] ?? 0)) best = bin
    const peak = amplitudes[best] ?? 0
    x.push(best * binWidth)
    y.push(peak > 0 ? Math.max(lowest, levelOfPeak(peak)) : lowest)
  }
  return { x, y }
}
