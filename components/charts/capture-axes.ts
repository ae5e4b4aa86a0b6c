import type uPlot from 'uplot'

import { quantityOverUnit } from '@/lib/figure/axis-title'
import { linearTicks } from '@/lib/figure/axis-ticks'

import { cssColour } from './css-colour'

/** Fixed, so that the cursor sliders below can line up with the plot (see capture-plot.css). */
export const axisWidth = 68

const ticksOf = (plot: uPlot, scaleKey: 'x' | 'y' | 'y2', unit: string, dimension: number, each: number) => {
  const scale = plot.scales[scaleKey]
  const domain = [scale?.min ?? 0, scale?.max ?? 1] as const
  return linearTicks(domain, unit, Math.min(10, Math.max(2, Math.floor(dimension / each))))
}

type AxisWords = { readonly label: string; readonly unit: () => string; readonly host: HTMLElement }

const sides = { x: 2, y: 3, y2: 1 } as const

/** An axis with the tick labels of our printed figures: one prefix for all, named in the title. */
export const captureAxis = (scale: 'x' | 'y' | 'y2', words: AxisWords): uPlot.Axis => {
  const dimension = (plot: uPlot) => (scale === 'x' ? plot.over.clientWidth : plot.over.clientHeight)
  const each = scale === 'x' ? 90 : 44
  const ticks = (plot: uPlot) => ticksOf(plot, scale, words.unit(), dimension(plot), each)
  const face = (token: string) => getComputedStyle(words.host).getPropertyValue(token) || 'sans-serif'
  return {
    scale,
    side: sides[scale],
    size: scale === 'x' ? 28 : axisWidth - 22,
    labelSize: 22,
    labelGap: 2,
    font: `12px ${face('--face-mono')}`,
    labelFont: `600 13px ${face('--face-sans')}`,
    stroke: () => cssColour(words.host, 'ink-soft'),
    grid: { show: scale !== 'y2', stroke: () => cssColour(words.host, 'rule'), width: 1 },
    ticks: { show: false },
    border: { show: true, stroke: () => cssColour(words.host, 'ink-soft'), width: 1 },
    splits: (plot) => [...ticks(plot).major],
    values: (plot) => ticks(plot).ticks.map((tick) => tick.label),
    label: (plot) => quantityOverUnit(words.label, ticks(plot).titleUnit),
  }
}
