import type uPlot from 'uplot'

import { nearestIndex, type TimeWindow } from '@/lib/figure/time-window'

import type { CaptureMarker, CaptureTrace, TraceTone } from './capture-points'

export type OverlayView = {
  readonly cursors: TimeWindow
  readonly markers: readonly CaptureMarker[]
  readonly traces: readonly CaptureTrace[]
}

export type OverlayLook = {
  readonly cursor: string
  readonly marker: string
  readonly paper: string
  readonly tone: (tone: TraceTone) => string
  readonly font: string
}

type Flag = {
  readonly x: number
  readonly label: string
  readonly colour: string
  readonly dash: number[]
  readonly row: number
  readonly side: 'left' | 'right'
}

/** Canvas pixels to one CSS pixel. */
export const pixelRatio = (plot: uPlot): number => plot.ctx.canvas.width / plot.width

/** Where the line of a flag stands, in canvas pixels; null outside the view. */
const positionOf = (plot: uPlot, flag: Flag): number | null => {
  const at = Math.round(plot.valToPos(flag.x, 'x', true)) + 0.5
  return at < plot.bbox.left || at > plot.bbox.left + plot.bbox.width ? null : at
}

const drawLine = (plot: uPlot, flag: Flag) => {
  const { ctx, bbox } = plot
  const at = positionOf(plot, flag)
  if (at === null) return
  const scale = pixelRatio(plot)
  ctx.strokeStyle = flag.colour
  ctx.lineWidth = 1.25 * scale
  ctx.setLineDash(flag.dash.map((length) => length * scale))
  ctx.beginPath()
  ctx.moveTo(at, bbox.top)
  ctx.lineTo(at, bbox.top + bbox.height)
  ctx.stroke()
}

const drawName = (plot: uPlot, flag: Flag, paper: string) => {
  const { ctx, bbox } = plot
  const at = positionOf(plot, flag)
  if (at === null) return
  const scale = pixelRatio(plot)
  const width = ctx.measureText(flag.label).width + 8 * scale
  const height = 17 * scale
  const hung = flag.side === 'left' ? at - width : at
  const left = Math.min(Math.max(hung, bbox.left), bbox.left + bbox.width - width)
  const top = bbox.top + 2 * scale + flag.row * (height + 2 * scale)
  ctx.fillStyle = flag.colour
  ctx.fillRect(left, top, width, height)
  ctx.fillStyle = paper
  ctx.fillText(flag.label, left + 4 * scale, top + height / 2)
}

/** The flags of the two cursors hang outwards, so that neither covers the other when they stand close. */
const flagsOf = ({ cursors, markers }: OverlayView, look: OverlayLook): Flag[] => {
  const isInOrder = cursors.from <= cursors.to
  const common = { colour: look.cursor, row: 0 }
  return [
    ...markers.map((marker) => ({
      ...marker,
      colour: look.marker,
      dash: [2, 3],
      row: 1,
      side: 'right' as const,
    })),
    { ...common, x: cursors.from, label: 'A', dash: [], side: isInOrder ? 'left' : 'right' },
    { ...common, x: cursors.to, label: 'B', dash: [6, 3], side: isInOrder ? 'right' : 'left' },
  ]
}

/** The name of each trace at its right end, on the line itself; a single trace is named by its axis. */
const drawTraceNames = (plot: uPlot, traces: readonly CaptureTrace[], look: OverlayLook) => {
  if (traces.length < 2) return
  const { ctx, bbox } = plot
  const scale = pixelRatio(plot)
  const right = plot.posToVal(plot.over.clientWidth - 1, 'x')
  let lowest = bbox.top
  const placed = traces
    .map((trace, index) => ({ trace, y: endOf(plot, trace, right, index) }))
    .sort((one, other) => one.y - other.y)
  for (const { trace, y } of placed) {
    const height = 17 * scale
    const top = Math.min(Math.max(y - height / 2, lowest), bbox.top + bbox.height - height)
    lowest = top + height
    const width = ctx.measureText(trace.label).width + 8 * scale
    const left = bbox.left + bbox.width - width
    ctx.fillStyle = look.paper
    ctx.fillRect(left, top, width, height)
    ctx.fillStyle = look.tone(trace.tone)
    ctx.fillText(trace.label, left + 4 * scale, top + height / 2)
  }
}

/** The height of a trace at the right edge of the view, in canvas pixels. */
function endOf(plot: uPlot, { points }: CaptureTrace, right: number, index: number): number {
  const at = nearestIndex(points.x, right)
  const level = ((points.min[at] ?? 0) + (points.max[at] ?? 0)) / 2
  return plot.valToPos(level, plot.series[2 * index + 1]?.scale ?? 'y', true)
}

/** Draws the markers of the page and the two cursors A and B, every name above every line. */
export const drawOverlay = (plot: uPlot, view: OverlayView, look: OverlayLook): void => {
  const { ctx } = plot
  const flags = flagsOf(view, look)
  ctx.save()
  ctx.font = look.font
  ctx.textAlign = 'left'
  ctx.textBaseline = 'middle'
  drawTraceNames(plot, view.traces, look)
  for (const flag of flags) drawLine(plot, flag)
  for (const flag of flags) drawName(plot, flag, look.paper)
  ctx.restore()
}
