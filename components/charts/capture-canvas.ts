import uPlot from 'uplot'

import type { TimeWindow } from '@/lib/figure/time-window'

import { captureAxis } from './capture-axes'
import { drawOverlay, pixelRatio, type OverlayView } from './capture-overlay'
import type { CaptureTrace } from './capture-points'
import { cssColour } from './css-colour'

export type CaptureView = OverlayView & { readonly traces: readonly CaptureTrace[] }

export type CaptureHandlers = {
  readonly onDrag: (window: TimeWindow) => void
  readonly onHover: (instant: number | null) => void
  readonly onReset: () => void
}

export type CaptureCanvas = {
  readonly show: (traces: readonly CaptureTrace[], window: TimeWindow) => void
  readonly redraw: () => void
  readonly resize: () => void
  readonly destroy: () => void
}

const heightFor = (width: number) => (width < 520 ? 280 : 360)

const tableOf = ({ points }: CaptureTrace): uPlot.AlignedData => [
  [...points.x],
  [...points.min],
  [...points.max],
]

/** Traces of one capture share their instants; those of another have their own, and gaps between are spanned. */
const columns = (traces: readonly CaptureTrace[]): uPlot.AlignedData =>
  traces.length === 0 ? [[]] : uPlot.join(traces.map(tableOf))

/** The units of the traces, in the order of their axes: the first at the left, another at the right. */
export const unitsOf = (traces: readonly CaptureTrace[]): readonly string[] => [
  ...new Set(traces.map(({ unit }) => unit)),
]

const scaleOf = (traces: readonly CaptureTrace[], unit: string): 'y' | 'y2' =>
  unitsOf(traces).indexOf(unit) === 0 ? 'y' : 'y2'

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
        tone: (tone) => cssColour(host, tone),
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

const seriesOf = (host: HTMLElement, traces: readonly CaptureTrace[]): uPlot.Series[] =>
  traces.flatMap((trace) => {
    const stroke = () => cssColour(host, trace.tone)
    const edge = {
      stroke,
      width: 1,
      points: { show: false },
      scale: scaleOf(traces, trace.unit),
      spanGaps: true,
    }
    return [
      { ...edge, label: `${trace.label}, lowest` },
      { ...edge, label: `${trace.label}, highest` },
    ]
  })

const axesOf = (host: HTMLElement, traces: readonly CaptureTrace[]): uPlot.Axis[] => [
  captureAxis('x', { label: 'Time', unit: () => 's', host }),
  ...unitsOf(traces)
    .slice(0, 2)
    .map((unit, index) => {
      const of = traces.filter((trace) => trace.unit === unit).map(({ label }) => label)
      return captureAxis(index === 0 ? 'y' : 'y2', { label: of.join(', '), unit: () => unit, host })
    }),
]

const optionsFor = (
  host: HTMLElement,
  view: () => CaptureView,
  handlers: CaptureHandlers,
): Omit<uPlot.Options, 'width' | 'height'> => {
  const { traces } = view()
  return {
    padding: [8, unitsOf(traces).length > 1 ? 0 : 16, 0, 0],
    legend: { show: false },
    scales: { x: { time: false, auto: false }, y: { auto: true }, y2: { auto: true } },
    axes: axesOf(host, traces),
    series: [{}, ...seriesOf(host, traces)],
    bands: traces.map(({ tone }, index) => ({
      series: [2 * index + 2, 2 * index + 1],
      fill: () => cssColour(host, tone),
    })),
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
  const empty: uPlot.AlignedData = [[], ...view().traces.flatMap((): [number[], number[]] => [[], []])]
  const plot = new uPlot({ ...optionsFor(host, view, handlers), ...size() }, empty, host)
  return {
    show: (traces, window) => {
      plot.batch(() => {
        plot.setData(columns(traces), false)
        plot.setScale('x', { min: window.from, max: window.to })
      })
    },
    redraw: () => plot.redraw(false, true),
    resize: () => plot.setSize(size()),
    destroy: () => plot.destroy(),
  }
}
