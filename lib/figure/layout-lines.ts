import type { Figure, Series, SeriesRole } from '@/lib/core/figure/figure'

import type { LineLayout, PlacedLabel, Rect } from './layout'
import { labelLine, type LabelSpace } from './place-labels'
import { plotPoint, type PlotScales } from './plot-scales'
import { clipPolyline, pathOf, type Point } from './polyline'

export type DrawnSeries = {
  readonly series: Series
  readonly rank: number
  readonly runs: readonly Point[][]
}

/** Every series as runs of points inside the plot, and its rank among those of its role. */
export const drawSeries = (figure: Figure, scales: PlotScales, plot: Rect): DrawnSeries[] => {
  const seen = new Map<SeriesRole, number>()
  return figure.series.map((series) => {
    const rank = seen.get(series.role) ?? 0
    seen.set(series.role, rank + 1)
    const points = series.x.map((x, index) => plotPoint(figure, scales, x, series.y[index]))
    return { series, rank, runs: clipPolyline(points, plot) }
  })
}

/** A limit is labelled first: it matters most and, being straight, has most room. */
const order: Record<SeriesRole, number> = { limit: 0, reference: 1, computed: 2, measured: 3 }

/** The lines in the figure's order, each with its label where one fits. */
export const layoutLines = (drawn: readonly DrawnSeries[], space: LabelSpace): LineLayout[] => {
  const labels = new Map<DrawnSeries, PlacedLabel | null>()
  for (const line of [...drawn].sort((a, b) => order[a.series.role] - order[b.series.role])) {
    labels.set(line, line.runs.length > 0 ? labelLine(space, line.series.label, line.runs) : null)
  }
  return drawn.map((line) => ({
    id: line.series.id,
    role: line.series.role,
    rank: line.rank,
    path: pathOf(line.runs),
    label: labels.get(line) ?? null,
  }))
}
