import uPlot from 'uplot'

import type { TimeWindow } from '@/lib/figure/time-window'

import { captureAxis } from './capture-axes'
import { drawOverlay, pixelRatio, type OverlayView } from './capture-overlay'
import type { CapturePoints } from './capture-points'
import { cssColour } from './css-colour'

export type CaptureView = OverlayView & { readonly seriesLabel: string; readonly unit: string }

export type CaptureHandlers = {
  readonly onDrag: (window: TimeWindow) => void
  readonly onHover: (instant: number | null) => void
  readonly onReset: () => void
}

export type CaptureCanvas = {
  readonly show: (points: CapturePoints, window: TimeWindow) => void
  readonly redraw: () => void
  readonly resize: () => void
  readonly destroy: () => void
}

const heightFor = (width: number) => (width < 520 ? 280 : 360)

const columns = (points: CapturePoints): uPlot.AlignedData => [
  [...points.x],
  [...points.min],
  [...points.max],
]

const selected = (plot: uPlot): TimeWindow => ({
  from: plot.posToVal(plot.select.left, 'x'),
  to: plot.posToVal(plot.select.left + plot.select.width, 'x'),
})

const hooksFor = (
  host: HTMLElement,
  view: () => CaptureView,
  handlers: CaptureHandlers,
): uPlot.Hooks.Arrays => ({
  draw: [
    (plot) => {
      drawOverlay(plot, view(), {
        cursor: cssColour(host, 'copper'),
        marker: cssColour(host, 'ink-soft'),
        paper: cssColour(host, 'sheet'),
        font: `600 ${12 * pixelRatio(plot)}px ${getComputedStyle(host).fontFamily}`,
      })
    },
  ],
  setCursor: [
    (plot) => {
      const left = plot.cursor.left ?? -1
      handlers.onHover(left >= 0 ? plot.posToVal(left, 'x') : null)
    },
  ],
  setSelect: [
    (plot) => {
      if (plot.select.width < 3) return
      const window = selected(plot)
      plot.setSelect({ left: 0, top: 0, width: 0, height: 0 }, false)
      handlers.onDrag(window)
    },
  ],
})

const optionsFor = (
  host: HTMLElement,
  view: () => CaptureView,
  handlers: CaptureHandlers,
): Omit<uPlot.Options, 'width' | 'height'> => {
  const ink = () => cssColour(host, 'ink')
  const edge = { stroke: ink, width: 1, points: { show: false } }
  return {
    padding: [8, 16, 0, 0],
    legend: { show: false },
    scales: { x: { time: false, auto: false }, y: { auto: true } },
    axes: [
      captureAxis('x', { label: 'Time', unit: () => 's', host }),
      captureAxis('y', { label: view().seriesLabel, unit: () => view().unit, host }),
    ],
    series: [{}, { ...edge, label: 'lowest' }, { ...edge, label: 'highest' }],
    bands: [{ series: [2, 1], fill: ink }],
    cursor: {
      y: false,
      points: { show: false },
      drag: { x: true, y: false, setScale: false },
      bind: {
        dblclick: () => () => {
          handlers.onReset()
          return null
        },
      },
    },
    hooks: hooksFor(host, view, handlers),
  }
}

/** The painted part of a capture plot: `view` is asked at every draw, `handlers` are told what the pointer does. */
export const createCaptureCanvas = (
  host: HTMLElement,
  view: () => CaptureView,
  handlers: CaptureHandlers,
): CaptureCanvas => {
  const size = () => ({ width: host.clientWidth, height: heightFor(host.clientWidth) })
  const plot = new uPlot({ ...optionsFor(host, view, handlers), ...size() }, [[], [], []], host)
  return {
    show: (points, window) => {
      plot.batch(() => {
        plot.setData(columns(points), false)
        plot.setScale('x', { min: window.from, max: window.to })
      })
    },
    redraw: () => plot.redraw(false, true),
    resize: () => plot.setSize(size()),
    destroy: () => plot.destroy(),
  }
}
