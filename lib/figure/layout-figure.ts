import type { Figure } from '@/lib/core/figure/figure'

import { layoutX, layoutY, ticksFor } from './axis-layout'
import { axisScale } from './axis-scale'
import { figureDomain } from './figure-domain'
import type { FigureLayout, KeyEntry, LayoutOptions, LineLayout, Rect } from './layout'
import { drawSeries, layoutLines } from './layout-lines'
import { layoutMarks, type DrawnMark } from './layout-marks'
import type { LabelSpace } from './place-labels'
import { textWidth } from './text-width'

/** The plot inside its margins, the left one wide enough for the labels of the vertical axis. */
const plotRect = (options: Required<LayoutOptions>, labels: readonly string[]): Rect => {
  const { width, height, textSize } = options
  const left = textSize * 2 + Math.max(0, ...labels.map((label) => textWidth(label, textSize, 'mono')))
  return {
    x: left,
    y: textSize,
    width: Math.max(1, width - left - textSize * 2),
    height: Math.max(1, height - textSize * 4.5),
  }
}

/** As many ticks as leave each the given number of text heights, between 2 and 10. */
const tickCount = (length: number, textSize: number, each: number): number =>
  Math.min(10, Math.max(2, Math.floor(length / (textSize * each))))

/** Labels that found no place in the plot. */
const keyOf = (figure: Figure, lines: readonly LineLayout[], marks: readonly DrawnMark[]): KeyEntry[] => [
  ...lines.flatMap((line, index) => {
    const text = figure.series[index]?.label ?? ''
    return line.path !== '' && line.label === null ? [{ role: line.role, rank: line.rank, text }] : []
  }),
  ...marks.flatMap(({ mark, layout }) =>
    layout.label === null
      ? [{ role: mark.kind === 'point' ? ('point' as const) : ('mark' as const), rank: 0, text: mark.label }]
      : [],
  ),
]

/**
 * Lays a figure out in a box of width by height: every position as a number, every line as path data, every text at its
 * baseline. The screen and the report draw the same layout; equal figures give equal layouts.
 */
export const layoutFigure = (figure: Figure, options: LayoutOptions): FigureLayout => {
  const full = { textSize: 12, ...options }
  const size = full.textSize
  const domain = figureDomain(figure)
  const yTicks = ticksFor(figure.y, domain.y, tickCount(full.height - size * 4.5, size, 3))
  const plot = plotRect(
    full,
    yTicks.ticks.map((tick) => tick.label),
  )
  const xTicks = ticksFor(figure.x, domain.x, tickCount(plot.width, size, 6))
  const scales = {
    x: axisScale(figure.x, domain.x, plot.x, plot.x + plot.width),
    y: axisScale(figure.y, domain.y, plot.y + plot.height, plot.y),
  }
  const drawn = drawSeries(figure, scales, plot)
  const space: LabelSpace = { plot, textSize: size, lines: drawn.map(({ runs }) => runs), taken: [] }
  const marks = layoutMarks(figure, scales, space)
  const lines = layoutLines(drawn, space)
  return {
    width: full.width,
    height: full.height,
    textSize: size,
    plot,
    x: layoutX(figure.x, xTicks, scales.x, plot, size),
    y: layoutY(figure.y, yTicks, scales.y, plot, size),
    lines,
    marks: marks.map(({ layout }) => layout),
    key: keyOf(figure, lines, marks),
  }
}
