import { sidebandsOf, type Sidebands, type SpreadLine } from '../spectrum/spread-spectrum'
import type { ReceiverBand } from './bands'
import { meanOf, peakOf, type EnvelopeCycle } from './envelope-cycle'
import { linesPassed, passedEnvelope } from './passed-envelope'
import { quasiPeakOf } from './quasi-peak'

/** How much lower each detector reads a swept line than the steady one, in dB, the receiver tuned where it reads most. */
export type SpreadReduction = {
  readonly peak: number
  /** Null in a band without a quasi-peak detector. */
  readonly quasiPeak: number | null
  readonly average: number
}

/** Tunings from the edge of the sweep to its middle. */
const tunings = 40

/** More lines than this in the sweep or in the passband take too long. */
const mostLines = 2 ** 14

/** Whether the lines of a sweep can be worked out one by one. */
export const isWithinReach = ({ width, rate }: SpreadLine, { bandwidth }: ReceiverBand): boolean =>
  rate > 0 && width >= 0 && width / rate <= mostLines && linesPassed(bandwidth, rate) <= mostLines

/**
 * The effect of spreading a line, as a receiver of a band reads it: sidebands from the modulation, through two critically
 * coupled stages, to the detectors; the tuning with the highest reading counts, as in a scan. Model: the receiver of
 * CISPR 16-1-1 as in `pulseResponse`. Valid where `isWithinReach`.
 */
export function spreadReduction(line: SpreadLine, band: ReceiverBand): SpreadReduction {
  const sidebands = sidebandsOf(line)
  const cycles = Array.from({ length: tunings + 1 }, (_, index) =>
    envelopeAt(sidebands, band.bandwidth, (-1.05 * line.width * (tunings - index)) / (2 * tunings)),
  )
  const highest = highestBy(cycles, peakOf)
  const strongest = highestBy(cycles, meanOf)
  const times = band.quasiPeak
  const quasiPeak =
    times === null ? null : Math.max(...[highest, strongest].map((cycle) => quasiPeakOf(cycle, times)))
  return {
    peak: reductionOf(peakOf(highest)),
    quasiPeak: quasiPeak === null ? null : reductionOf(quasiPeak),
    average: reductionOf(meanOf(strongest)),
  }
}

/** The filter rings over by a fraction of a dB; that is no rise of the line. */
const reductionOf = (reading: number): number => Math.max(0, -20 * Math.log10(reading))

function highestBy(
  cycles: readonly EnvelopeCycle[],
  measure: (cycle: EnvelopeCycle) => number,
): EnvelopeCycle {
  return cycles.reduce((best, cycle) => (measure(cycle) > measure(best) ? cycle : best))
}

function envelopeAt({ lines, count, spacing }: Sidebands, b6: number, tuned: number): EnvelopeCycle {
  const lineAt = (multiple: number): readonly [number, number] => {
    const at = 2 * (multiple + count)
    return Math.abs(multiple) > count ? [0, 0] : [lines[at] ?? 0, lines[at + 1] ?? 0]
  }
  return passedEnvelope(lineAt, spacing, b6, tuned)
}
