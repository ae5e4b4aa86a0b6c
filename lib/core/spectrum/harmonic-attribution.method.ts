import type { Figure } from '../figure/figure'
import { defineMethod, type ChoiceTable } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import {
  allClashes,
  attributePeaks,
  candidateText,
  separatingMeasurement,
  type AttributedPeak,
} from './attribution'
import type { CombCandidate, CombClash, CombTolerance } from './comb'
import { harmonicAttributionTexts } from './harmonic-attribution.texts'

/** Which source makes which peak. */
export const harmonicAttribution = defineMethod({
  id: 'harmonic-attribution',
  version: 1,
  ...harmonicAttributionTexts,
  inputs: {
    resolution: {
      label: 'Resolution bandwidth',
      symbol: 'RBW',
      unit: 'Hz',
      help: 'Of the scan; half of it is the tolerance of reading a peak',
      isRequired: true,
      above: 0,
      atMost: 1e9,
    },
    sources: {
      kind: 'table',
      label: 'Sources',
      symbol: 'f, h',
      help: 'Name, frequency and tolerance in ppm (100 where left out), a line each',
      isRequired: true,
      columns: {
        name: { label: 'Name', symbol: '', unit: 'text' },
        frequency: { label: 'Frequency', symbol: 'f', unit: 'Hz', atLeast: 1, atMost: 1e12 },
        ppm: { label: 'Tolerance', symbol: '', unit: 'ppm', atLeast: 0, atMost: 200_000, fallback: 100 },
      },
      leastRows: 1,
      mostRows: 50,
    },
    peaks: {
      kind: 'table',
      label: 'Peaks',
      symbol: 'p',
      help: 'Frequency and level, a line each; the level may be left out',
      isRequired: true,
      columns: {
        frequency: { label: 'Frequency', symbol: 'f', unit: 'Hz', above: 0, atMost: 1e12 },
        level: { label: 'Level', symbol: 'L', unit: 'dBµV', atLeast: -300, atMost: 300, fallback: 0 },
      },
      leastRows: 1,
      mostRows: 20_000,
    },
  },
  compute: ({ resolution, sources, peaks }) => {
    const tolerance = { ppm: 0, hertz: resolution / 2, mostPerSource: 10 }
    const attributed = attributePeaks(peaks, sources, tolerance)
    const clashes = allClashes(attributed, tolerance)
    const count = (verdict: AttributedPeak['verdict']) =>
      attributed.filter((peak) => peak.verdict === verdict).length
    const lowest = Math.min(...sources.map(({ frequency }) => frequency))
    const isNarrow = resolution < lowest / 4
    return ok({
      results: [
        main('explained', 'Peaks with one source', '', '', count('explained')),
        main('ambiguous', 'Peaks with several possible sources', '', '', count('ambiguous')),
        main('unexplained', 'Peaks without a source', '', '', count('unexplained')),
        step('inseparable', 'Pairs of lines that this RBW cannot tell apart', '', '', clashes.length),
        step('tolerance', 'Tolerance of reading a peak', 'RBW/2', 'Hz', resolution / 2),
      ],
      choices: [peakTable(attributed), clashTable(clashes, tolerance)],
      validity: [
        {
          passed: isNarrow,
          sentence: isNarrow
            ? 'The resolution bandwidth is narrow against the spacing of the harmonics.'
            : 'The resolution bandwidth is more than a quarter of the lowest source frequency: many peaks match by chance.',
        },
        {
          passed: clashes.length === 0,
          sentence:
            clashes.length === 0
              ? 'No two sources fall together within this resolution.'
              : 'Some lines of different sources fall together: the table says what measurement would tell them apart.',
        },
      ],
      figures: [peakFigure(attributed)],
    })
  },
  // Counts have no interval.
  computeResults: () => ok([]),
})

/** Rows of a table for people; all peaks are counted. */
const mostRows = 200

const peakTable = (peaks: readonly AttributedPeak[]): ChoiceTable => ({
  title:
    peaks.length > mostRows
      ? `The ${mostRows} strongest of ${peaks.length} peaks`
      : 'Peaks and what they may be',
  columns: [
    { label: 'Frequency', unit: 'Hz' },
    { label: 'Level', unit: 'dBµV' },
    { label: 'Verdict', unit: 'text' },
    { label: 'Source × harmonic', unit: 'text' },
    { label: 'Nearest line lies off by', unit: 'Hz' },
  ],
  rows: peaks
    .toSorted((a, b) => b.level - a.level)
    .slice(0, mostRows)
    .map(({ frequency, level, verdict, candidates }) => [
      frequency,
      level,
      verdict,
      candidatesText(candidates),
      candidates.reduce(
        (least, { deviation }) => (Math.abs(deviation) < Math.abs(least) ? deviation : least),
        candidates[0]?.deviation ?? 0,
      ),
    ]),
})

const clashTable = (clashes: readonly CombClash[], tolerance: CombTolerance): ChoiceTable => ({
  title: 'Lines that fall together, and how to tell them apart',
  columns: [
    { label: 'One', unit: 'text' },
    { label: 'Other', unit: 'text' },
    { label: 'Apart by', unit: 'Hz' },
    { label: 'Needed', unit: 'Hz' },
    { label: 'What would separate them', unit: 'text' },
  ],
  rows: clashes
    .slice(0, mostRows)
    .map((clash) => [
      candidateText(clash.first),
      candidateText(clash.second),
      clash.spacing,
      clash.needed,
      separatingMeasurement(clash, tolerance),
    ]),
})

/** So many candidates are written out. */
const mostNamed = 6

function candidatesText(candidates: readonly CombCandidate[]): string {
  if (candidates.length === 0) return '–'
  const named = candidates.slice(0, mostNamed).map(candidateText)
  const more = candidates.length - named.length
  return [...named, ...(more > 0 ? [`${more} more`] : [])].join(' or ')
}

function peakFigure(peaks: readonly AttributedPeak[]): Figure {
  const sorted = peaks.toSorted((a, b) => a.frequency - b.frequency)
  const strongest = peaks.toSorted((a, b) => b.level - a.level).slice(0, 6)
  return {
    id: 'attributed-peaks',
    title: 'Peaks and their sources',
    description: 'The peaks by frequency; the strongest are named by their source and harmonic.',
    x: { label: 'Frequency', unit: 'Hz', scale: 'log' },
    y: { label: 'Level', unit: 'dBµV', scale: 'linear' },
    series: [
      {
        id: 'peaks',
        label: 'Peaks',
        role: 'measured',
        x: sorted.map(({ frequency }) => frequency),
        y: sorted.map(({ level }) => level),
      },
    ],
    marks: strongest.map(({ frequency, level, candidates }) => ({
      kind: 'point',
      x: frequency,
      y: level,
      label: candidates[0] ? candidates.map(candidateText).slice(0, 2).join(' or ') : 'unexplained',
    })),
  }
}
