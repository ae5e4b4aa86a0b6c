import type { Axis, Figure, Series } from '@/lib/core/figure/figure'

import { columnLabels, engineeringLabel, type EngineeringLabel } from './engineering-label'

export type ValueRow = {
  /** Place in the series, from 0. */
  readonly index: number
  readonly x: EngineeringLabel
  readonly y: EngineeringLabel
  readonly note: string
}

export type ValueTable = {
  readonly id: string
  readonly label: string
  readonly rows: readonly ValueRow[]
  /** Points that the series holds; more than `rows` when the table shows a selection. */
  readonly total: number
}

const indexOfExtreme = (values: readonly number[], isBetter: (a: number, b: number) => boolean): number => {
  let best = -1
  for (let index = 0; index < values.length; index += 1) {
    const value = values[index]
    const current = values[best]
    if (value === undefined || !Number.isFinite(value)) continue
    if (current === undefined || isBetter(value, current)) best = index
  }
  return best
}

const selection = (length: number, most: number, extremes: readonly number[]): number[] => {
  const even =
    length <= most
      ? Array.from({ length }, (_, index) => index)
      : Array.from({ length: most }, (_, index) => Math.round((index * (length - 1)) / (most - 1)))
  return [...new Set([...even, ...extremes.filter((index) => index >= 0)])].sort((a, b) => a - b)
}

/** Values of a linear axis are compared with each other; those of a logarithmic axis span too much for one prefix. */
const labelsFor = (axis: Axis, values: readonly number[]): EngineeringLabel[] =>
  axis.scale === 'log'
    ? values.map((value) => engineeringLabel(value, axis.unit))
    : columnLabels(values, axis.unit)

const tableOf = (series: Series, x: Axis, y: Axis, most: number): ValueTable => {
  const highest = indexOfExtreme(series.y, (a, b) => a > b)
  const lowest = indexOfExtreme(series.y, (a, b) => a < b)
  const noteFor = (index: number) => (index === highest ? 'highest' : index === lowest ? 'lowest' : '')
  const chosen = selection(series.x.length, most, [highest, lowest])
  const nothing: EngineeringLabel = { number: '–', unit: '' }
  const xLabels = labelsFor(
    x,
    chosen.map((index) => series.x[index] ?? NaN),
  )
  const yLabels = labelsFor(
    y,
    chosen.map((index) => series.y[index] ?? NaN),
  )
  const rows = chosen.map((index, row) => ({
    index,
    x: xLabels[row] ?? nothing,
    y: yLabels[row] ?? nothing,
    note: noteFor(index),
  }))
  return { id: series.id, label: series.label, rows, total: series.x.length }
}

/** The figure as tables, one a series: evenly chosen points and always the highest and the lowest. */
export const valueTables = (figure: Figure, most = 20): ValueTable[] =>
  figure.series.map((series) => tableOf(series, figure.x, figure.y, most))
