import type { TimeWindow } from '@/lib/figure/time-window'

export type ViewedChannel = { readonly position: number; readonly name: string; readonly unit: string }

/** A capture as the viewer needs it: nothing but what it shows. */
export type ViewedCapture = {
  readonly evidenceId: string
  readonly name: string
  readonly extent: TimeWindow
  readonly channels: readonly ViewedChannel[]
}

/** What a line of the plot is fetched from: a channel, or the difference of two, moved by a time. */
export type TraceSource = {
  readonly key: string
  readonly label: string
  readonly unit: string
  readonly evidenceId: string
  readonly channel: number
  readonly minus: number | null
  /** Taken off the instants of the file, so that the edges of two captures lie over each other. */
  readonly shiftSeconds: number
}

/** Two axes stand at the sides of a plot, so that at most two units are seen at once. */
const mostUnits = 2
const mostTraces = 4

export const channelSource = (
  capture: ViewedCapture,
  channel: ViewedChannel,
  shiftSeconds = 0,
  suffix = '',
): TraceSource => ({
  key: `${capture.evidenceId}:${channel.position}`,
  label: `${channel.name}${suffix}`,
  unit: channel.unit,
  evidenceId: capture.evidenceId,
  channel: channel.position,
  minus: null,
  shiftSeconds,
})

export const differenceSource = (
  capture: ViewedCapture,
  plus: ViewedChannel,
  minus: ViewedChannel,
): TraceSource => ({
  ...channelSource(capture, plus),
  key: `${capture.evidenceId}:${plus.position}-${minus.position}`,
  label: `${plus.name} − ${minus.name}`,
  minus: minus.position,
})

/** The sources that can be seen together, from the first on: four lines, two units. */
export function seenTogether(sources: readonly TraceSource[]): readonly TraceSource[] {
  const units = [...new Set(sources.map(({ unit }) => unit))].slice(0, mostUnits)
  return sources.filter(({ unit }) => units.includes(unit)).slice(0, mostTraces)
}
