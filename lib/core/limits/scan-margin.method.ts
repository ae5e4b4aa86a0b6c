import { defineMethod, noSolution, type ChoiceTable, type ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { standingWarning } from './limit-at'
import type { LimitTable } from './limit-table'
import { findLimitTable, limitTables, limitTitle } from './limit-tables'
import { detectorVerdict, marginsOf, type PointMargin } from './scan-margin'
import { scanMarginFigure } from './scan-margin-figure'
import { scanMarginTexts } from './scan-margin.texts'
import { upperMeasurementFrequency } from './upper-frequency'

/** The margins of a measured scan against a limit line. */
export const scanMargin = defineMethod({
  id: 'scan-margin',
  version: 1,
  ...scanMarginTexts,
  inputs: {
    limit: {
      kind: 'choice',
      label: 'Limit',
      symbol: 'L',
      help: 'Standard, class, port or distance, detector',
      isRequired: true,
      options: Object.fromEntries(limitTables.map((table) => [table.id, limitTitle(table)])),
    },
    detector: {
      kind: 'choice',
      label: 'Detector of the scan',
      symbol: 'D',
      help: 'As the receiver was set',
      isRequired: true,
      options: { peak: 'Peak', 'quasi-peak': 'Quasi-peak', average: 'Average' },
    },
    correction: {
      label: 'Correction',
      symbol: 'k',
      unit: 'dB',
      help: 'Added to every level: antenna or transducer factor, cable, distance',
      isRequired: false,
      atLeast: -200,
      atMost: 200,
    },
    highest: {
      label: 'Highest frequency in the equipment',
      symbol: 'f_max',
      unit: 'Hz',
      help: 'Clock or switching frequency; tells how far up to measure',
      isRequired: false,
      above: 0,
      atMost: 1e12,
    },
    points: {
      kind: 'table',
      label: 'Scan',
      symbol: 'f, level',
      help: 'Frequency and level, a line each; levels as plain numbers in the unit of the limit',
      isRequired: true,
      columns: {
        frequency: { label: 'Frequency', symbol: 'f', unit: 'Hz', above: 0, atMost: 1e12 },
        level: { label: 'Level', symbol: 'L', unit: 'dBµV', atLeast: -200, atMost: 300 },
      },
      leastRows: 1,
      mostRows: 20_000,
    },
  },
  compute: ({ limit, detector, correction = 0, highest, points }) => {
    const table = findLimitTable(limit)
    if (!table) return err(noSolution('There is no such limit.', 'limit'))
    const margins = marginsOf(points, table, correction)
    const [worst] = margins
    if (!worst) {
      const message =
        'This limit covers none of the frequencies of the scan. Check the unit of the frequencies.'
      return err(noSolution(message, 'points', 'limit'))
    }
    return ok({
      results: [
        main('worst', 'Smallest margin', 'L − level', 'dB', worst.margin),
        main('worstFrequency', 'Where it is', 'f', 'Hz', worst.frequency),
        main('over', 'Points over the limit', '', '', margins.filter(({ margin }) => margin < 0).length),
        step('judged', 'Points that the limit covers', '', '', margins.length),
        step('outside', 'Points outside the limit’s range', '', '', points.length - margins.length),
        step('worstLevel', 'Level there', '', table.unit, worst.level),
        step('worstLimit', 'Limit there', '', table.unit, worst.limit),
        ...(highest === undefined
          ? []
          : [
              step(
                'upTo',
                'To be measured up to, by 47 CFR 15.33',
                '',
                'Hz',
                upperMeasurementFrequency(highest),
              ),
            ]),
      ],
      choices: [worstTable(margins, table)],
      validity: validityOf(table, detector, margins),
      figures: [scanMarginFigure(table, margins, worst)],
    })
  },
  // A correction moves every margin by itself: no scan need be judged again.
  computeResults: ({ limit, correction = 0, points }) => {
    const table = findLimitTable(limit)
    const worst = table ? uncorrectedWorst(points, table) : undefined
    if (worst === undefined)
      return err(noSolution('This limit covers none of the frequencies of the scan.', 'points'))
    return ok([main('worst', 'Smallest margin', 'L − level', 'dB', worst - correction)])
  },
})

type Points = Parameters<typeof marginsOf>[0]

const judged = new WeakMap<Points, { readonly tableId: string; readonly worst: number | undefined }>()

function uncorrectedWorst(points: Points, table: LimitTable): number | undefined {
  const known = judged.get(points)
  if (known?.tableId === table.id) return known.worst
  const worst = marginsOf(points, table, 0)[0]?.margin
  judged.set(points, { tableId: table.id, worst })
  return worst
}

const worstTable = (margins: readonly PointMargin[], { unit }: LimitTable): ChoiceTable => ({
  title: 'The smallest margins',
  columns: [
    { label: 'Frequency', unit: 'Hz' },
    { label: 'Level', unit },
    { label: 'Limit', unit },
    { label: 'Margin', unit: 'dB' },
    { label: 'Against the limit', unit: 'text' },
  ],
  rows: margins
    .slice(0, 20)
    .map(({ frequency, level, limit, margin }) => [
      frequency,
      level,
      limit,
      margin,
      margin < 0 ? 'over' : 'below',
    ]),
})

function validityOf(
  table: LimitTable,
  detector: LimitTable['detector'],
  margins: readonly PointMargin[],
): readonly ValidityCheck[] {
  const warning = standingWarning(table)
  const close = margins.filter(({ margin }) => Math.abs(margin) < 4).length
  return [
    detectorVerdict(detector, table),
    {
      passed: warning === null,
      sentence: warning ?? `The numbers of the limit were read in a public copy (${table.source}).`,
    },
    {
      passed: close === 0,
      sentence:
        close === 0
          ? 'No point is within 4 dB of the limit.'
          : `${close} points are within 4 dB of the limit, about the uncertainty of a pre-compliance measurement: they may turn out either way.`,
    },
  ]
}
