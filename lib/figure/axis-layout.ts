import type { Axis } from '@/lib/core/figure/figure'

import type { AxisScale } from './axis-scale'
import { quantityOverUnit } from './axis-title'
import { linearTicks, logTicks, type AxisTicks, type Tick } from './axis-ticks'
import type { AxisLayout, GridLine, PlacedText, Rect } from './layout'
import { textWidth } from './text-width'

export const ticksFor = (axis: Axis, domain: readonly [number, number], count: number): AxisTicks =>
  axis.scale === 'log' ? logTicks(domain, axis.unit, count) : linearTicks(domain, axis.unit, count)

/** Keeps the ticks, best rank first, whose text stays clear of those kept before it. */
const clearTicks = (ticks: readonly Tick[], spanOf: (tick: Tick) => readonly [number, number]): Tick[] => {
  const kept: { tick: Tick; span: readonly [number, number] }[] = []
  const byRank = ticks
    .map((tick, order) => ({ tick, order }))
    .sort((a, b) => a.tick.rank - b.tick.rank || a.order - b.order)
  for (const { tick } of byRank) {
    const span = spanOf(tick)
    if (kept.every((other) => span[1] <= other.span[0] || span[0] >= other.span[1])) kept.push({ tick, span })
  }
  return kept.map(({ tick }) => tick).sort((a, b) => a.value - b.value)
}

const gridOf = (ticks: AxisTicks, scale: AxisScale): GridLine[] => [
  ...ticks.minor.map((value) => ({ position: scale.at(value), weight: 'minor' as const })),
  ...ticks.major.map((value) => ({ position: scale.at(value), weight: 'major' as const })),
]

export const layoutX = (
  axis: Axis,
  ticks: AxisTicks,
  scale: AxisScale,
  plot: Rect,
  size: number,
): AxisLayout => {
  const bottom = plot.y + plot.height
  const shown = clearTicks(ticks.ticks, (tick) => {
    const half = textWidth(tick.label, size, 'mono') / 2 + size * 0.4
    return [scale.at(tick.value) - half, scale.at(tick.value) + half]
  })
  return {
    title: {
      text: quantityOverUnit(axis.label, ticks.titleUnit),
      x: plot.x + plot.width / 2,
      y: bottom + size * 3,
      anchor: 'middle',
      rotation: 0,
    },
    ticks: shown.map((tick): PlacedText => ({
      text: tick.label,
      x: scale.at(tick.value),
      y: bottom + size * 1.35,
      anchor: 'middle',
      rotation: 0,
    })),
    grid: gridOf(ticks, scale),
  }
}

export const layoutY = (
  axis: Axis,
  ticks: AxisTicks,
  scale: AxisScale,
  plot: Rect,
  size: number,
): AxisLayout => {
  const shown = clearTicks(ticks.ticks, (tick) => {
    const half = size * 0.7
    return [scale.at(tick.value) - half, scale.at(tick.value) + half]
  })
  return {
    title: {
      text: quantityOverUnit(axis.label, ticks.titleUnit),
      x: size,
      y: plot.y + plot.height / 2,
      anchor: 'middle',
      rotation: -90,
    },
    ticks: shown.map((tick): PlacedText => ({
      text: tick.label,
      x: plot.x - size * 0.5,
      y: scale.at(tick.value) + size * 0.34,
      anchor: 'end',
      rotation: 0,
    })),
    grid: gridOf(ticks, scale),
  }
}
