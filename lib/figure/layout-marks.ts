import type { Figure, Mark } from '@/lib/core/figure/figure'

import { isDrawable } from './axis-scale'
import type { MarkLayout, Rect } from './layout'
import { labelInstant, labelLevel, labelPoint, type LabelSpace } from './place-labels'
import { plotPoint, type PlotScales } from './plot-scales'

export type DrawnMark = { readonly mark: Mark; readonly layout: MarkLayout }

const isAcross = (plot: Rect, x: number) => x >= plot.x && x <= plot.x + plot.width
const isDown = (plot: Rect, y: number) => y >= plot.y && y <= plot.y + plot.height

const layoutMark = (figure: Figure, scales: PlotScales, space: LabelSpace, mark: Mark): MarkLayout | null => {
  const { plot } = space
  if (mark.kind === 'level') {
    const y = isDrawable(figure.y, mark.y) ? scales.y.at(mark.y) : NaN
    if (!isDown(plot, y)) return null
    const label = labelLevel(space, mark.label, y)
    return { kind: mark.kind, x1: plot.x, y1: y, x2: plot.x + plot.width, y2: y, label }
  }
  if (mark.kind === 'instant') {
    const x = isDrawable(figure.x, mark.x) ? scales.x.at(mark.x) : NaN
    if (!isAcross(plot, x)) return null
    const label = labelInstant(space, mark.label, x)
    return { kind: mark.kind, x1: x, y1: plot.y, x2: x, y2: plot.y + plot.height, label }
  }
  const point = plotPoint(figure, scales, mark.x, mark.y)
  if (!point || !isAcross(plot, point[0]) || !isDown(plot, point[1])) return null
  const [x, y] = point
  return { kind: mark.kind, x1: x, y1: y, x2: x, y2: y, label: labelPoint(space, mark.label, point) }
}

/** Points first, for their labels can move least; then levels, then instants. */
const order: Record<Mark['kind'], number> = { point: 0, level: 1, instant: 2 }

/** The marks that lie inside the plot, in the figure's order, their labels placed. */
export const layoutMarks = (figure: Figure, scales: PlotScales, space: LabelSpace): DrawnMark[] =>
  figure.marks
    .map((mark, index) => ({ mark, index }))
    .sort((a, b) => order[a.mark.kind] - order[b.mark.kind] || a.index - b.index)
    .map(({ mark, index }) => ({ mark, index, layout: layoutMark(figure, scales, space, mark) }))
    .sort((a, b) => a.index - b.index)
    .flatMap(({ mark, layout }) => (layout ? [{ mark, layout }] : []))
