import type { Figure } from '@/lib/core/figure/figure'
import { quantityText } from '@/lib/core/units/format-quantity'
import type { ThinnedSpectrum } from '@/lib/ports/spectrum-computer'

/** Levels further below the strongest line than this are not drawn: an 8-bit record shows nothing there. */
const drawnDecibels = 100

export function spectrumFigure(channel: string, spectrum: ThinnedSpectrum): Figure {
  const { frequencies, levels } = spectrum
  const top = Math.ceil(Math.max(...levels) / 10) * 10
  const strongest = levels.indexOf(Math.max(...levels))
  const peak = `${quantityText(levels[strongest] ?? 0, 'dBµV')} at ${quantityText(frequencies[strongest] ?? 0, 'Hz', 5)}`
  return {
    id: 'spectrum-in-view',
    title: `Spectrum of ${channel}`,
    description: `Levels of sines as a receiver shows them, rms; the strongest is ${peak}.`,
    x: { label: 'Frequency', unit: 'Hz', scale: 'log' },
    y: { label: 'Level', unit: 'dBµV', scale: 'linear', range: [top - drawnDecibels, top] },
    series: [
      {
        id: 'spectrum',
        label: channel,
        role: 'measured',
        x: frequencies,
        y: levels.map((level) => Math.max(top - drawnDecibels, level)),
      },
    ],
    marks: [],
  }
}

/** What was used, and what it is not. */
export function spectrumRemark(spectrum: ThinnedSpectrum): string {
  const { sampleCount, windowName, resolutionBandwidth, isWholePeriods } = spectrum
  const window = isWholePeriods
    ? 'no window, as the part holds whole periods'
    : `window ${windowName.toLowerCase()}`
  return `${sampleCount.toLocaleString('en')} samples, ${window}; equivalent resolution bandwidth ${quantityText(resolutionBandwidth, 'Hz', 3)}. Not a receiver’s reading: compare with a limit only where this is the bandwidth that the limit asks for.`
}
