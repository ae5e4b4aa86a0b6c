import { scaleLinear, scaleLog } from 'd3-scale'

import type { Axis } from '@/lib/core/figure/figure'

export type AxisScale = {
  readonly kind: 'linear' | 'log'
  readonly domain: readonly [number, number]
  readonly at: (value: number) => number
}

/** Whether a value can be drawn on this axis at all. */
export const isDrawable = (axis: Axis, value: number | undefined): value is number =>
  value !== undefined && Number.isFinite(value) && (axis.scale === 'linear' || value > 0)

const extentOf = (axis: Axis, values: Iterable<number>): [number, number] | null => {
  let low = Infinity
  let high = -Infinity
  for (const value of values) {
    if (!isDrawable(axis, value)) continue
    if (value < low) low = value
    if (value > high) high = value
  }
  return low <= high ? [low, high] : null
}

const widened = (axis: Axis, [low, high]: readonly [number, number]): [number, number] => {
  if (low !== high) return [low, high]
  if (axis.scale === 'log') return [low / 2, high * 2]
  const half = low === 0 ? 1 : Math.abs(low) / 2
  return [low - half, high + half]
}

const usableRange = (axis: Axis): readonly [number, number] | null => {
  const range = axis.range
  if (!range || !isDrawable(axis, range[0]) || !isDrawable(axis, range[1])) return null
  return range[0] <= range[1] ? range : [range[1], range[0]]
}

/**
 * What the axis shows: its stated range, else the extent of the data. Only a vertical axis is rounded outwards
 * (`roomy`), with headroom so that labels find a place; a record keeps its own first and last instant.
 */
export const axisDomain = (axis: Axis, values: Iterable<number>, roomy: boolean): [number, number] => {
  const stated = usableRange(axis)
  if (stated) return widened(axis, stated)
  const extent = extentOf(axis, values)
  if (!extent) return axis.scale === 'log' ? [1, 10] : [0, 1]
  const [low, high] = widened(axis, extent)
  if (!roomy) return [low, high]
  if (axis.scale === 'log') return [low / 1.25, high * 1.25]
  const margin = (high - low) * 0.06
  const nice = scaleLinear()
    .domain([low - margin, high + margin])
    .nice(6)
    .domain()
  return [nice[0] ?? low, nice[1] ?? high]
}

/** Maps values to positions: `from` for the lower end of the domain, `to` for the upper. */
export const axisScale = (
  axis: Axis,
  domain: readonly [number, number],
  from: number,
  to: number,
): AxisScale => {
  const scale = (axis.scale === 'log' ? scaleLog() : scaleLinear()).domain(domain).range([from, to])
  return { kind: axis.scale, domain, at: (value) => scale(value) }
}
