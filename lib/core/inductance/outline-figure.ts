import type { Figure } from '../figure/figure'
import { quantityText } from '../units/format-quantity'
import type { Polygon } from './polygon'

/** Width to height of the usual plot on the screen, so that both axes have about the same scale there. */
const shape = 2

/** The outline of a loop as it was entered, its first corner marked. */
export function outlineFigure({ corners, area, perimeter }: Polygon): Figure {
  const closed = [...corners, ...corners.slice(0, 1)]
  const [x, y] = [closed.map((corner) => corner[0]), closed.map((corner) => corner[1])]
  const [across, up] = [middleAndSpan(x), middleAndSpan(y)]
  const half = 0.55 * Math.max(up.span, across.span / shape)
  const [firstX = 0, firstY = 0] = corners[0] ?? []
  return {
    id: 'loop-outline',
    title: 'Outline of the loop',
    description: `${corners.length} corners around ${quantityText(area, 'm²')}, ${quantityText(perimeter, 'm')} in length.`,
    x: {
      label: 'x',
      unit: 'm',
      scale: 'linear',
      range: [across.middle - half * shape, across.middle + half * shape],
    },
    y: { label: 'y', unit: 'm', scale: 'linear', range: [up.middle - half, up.middle + half] },
    series: [{ id: 'outline', label: 'Middle of the conductor', role: 'computed', x, y }],
    marks: [{ kind: 'point', x: firstX, y: firstY, label: 'First corner' }],
  }
}

function middleAndSpan(values: readonly number[]): { readonly middle: number; readonly span: number } {
  const [low, high] = [Math.min(...values), Math.max(...values)]
  return { middle: (low + high) / 2, span: high - low }
}
