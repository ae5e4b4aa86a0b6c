import type { Figure, Series } from '@/lib/core/figure/figure'

import { axisDomain } from './axis-scale'

type Range = readonly [number, number]

const reaches = (a: number | undefined, b: number | undefined, [low, high]: Range): boolean =>
  a !== undefined && b !== undefined && Math.max(a, b) >= low && Math.min(a, b) <= high

/** Levels of the parts of a series that the x range shows, the ends of segments that only cross it included. */
const levelsInView = function* (series: Series, range: Range): Generator<number> {
  for (let index = 0; index < series.x.length; index += 1) {
    const x = series.x[index]
    const y = series.y[index]
    if (y === undefined) continue
    const shows =
      reaches(x, x, range) || reaches(series.x[index - 1], x, range) || reaches(x, series.x[index + 1], range)
    if (shows) yield y
  }
}

/** A peak outside the x range must not flatten what is in view. */
const allLevels = function* (figure: Figure, range: Range): Generator<number> {
  for (const series of figure.series) yield* levelsInView(series, range)
  for (const mark of figure.marks) if (mark.kind !== 'instant') yield mark.y
}

const allInstants = function* (figure: Figure): Generator<number> {
  for (const series of figure.series) yield* series.x
}

/** What the two axes show: their stated range, else what the data needs. */
export const figureDomain = (figure: Figure): { readonly x: Range; readonly y: Range } => {
  const marked = figure.marks.flatMap((mark) => (mark.kind === 'level' ? [] : [mark.x]))
  const hasPoints = figure.series.some((series) => series.x.length > 0)
  const x = axisDomain(figure.x, hasPoints ? allInstants(figure) : marked, false)
  return { x, y: axisDomain(figure.y, allLevels(figure, x), true) }
}
