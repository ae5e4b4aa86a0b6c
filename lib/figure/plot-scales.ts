import type { Figure } from '@/lib/core/figure/figure'

import { isDrawable, type AxisScale } from './axis-scale'
import type { Point } from './polyline'

export type PlotScales = { readonly x: AxisScale; readonly y: AxisScale }

/** Where a value pair lies in the layout; null when an axis cannot show it (not a number, or not above 0 on a log axis). */
export const plotPoint = (
  figure: Figure,
  scales: PlotScales,
  x: number | undefined,
  y: number | undefined,
): Point | null =>
  isDrawable(figure.x, x) && isDrawable(figure.y, y) ? [scales.x.at(x), scales.y.at(y)] : null
