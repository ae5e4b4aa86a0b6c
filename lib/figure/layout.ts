import type { SeriesRole } from '@/lib/core/figure/figure'

/** Text at its baseline, as both SVG and PDF place it. Rotation in degrees about (x, y), clockwise. */
export type PlacedText = {
  readonly text: string
  readonly x: number
  readonly y: number
  readonly anchor: 'start' | 'middle' | 'end'
  readonly rotation: 0 | -90
}

export type Rect = { readonly x: number; readonly y: number; readonly width: number; readonly height: number }

export type GridLine = { readonly position: number; readonly weight: 'major' | 'minor' }

export type AxisLayout = {
  readonly title: PlacedText
  readonly ticks: readonly PlacedText[]
  /** Positions along the axis, x or y; lines run across the whole plot. */
  readonly grid: readonly GridLine[]
}

/** A label and the box behind it, which a renderer may fill so that the text stays legible over a line. */
export type PlacedLabel = PlacedText & { readonly box: Rect }

export type LineLayout = {
  readonly id: string
  readonly role: SeriesRole
  /** Which one of its role it is, from 0; with the role it decides the dash. */
  readonly rank: number
  /** SVG path data, clipped to the plot; empty when nothing of the series lies inside it. */
  readonly path: string
  /** Written on the line; absent when it would hide something, then the label is listed in `key`. */
  readonly label: PlacedLabel | null
}

export type MarkLayout = {
  readonly kind: 'level' | 'instant' | 'point'
  /** A line, or for a point the centre twice. */
  readonly x1: number
  readonly y1: number
  readonly x2: number
  readonly y2: number
  readonly label: PlacedLabel | null
}

export type KeyEntry = {
  readonly role: SeriesRole | 'mark' | 'point'
  readonly rank: number
  readonly text: string
}

export type FigureLayout = {
  readonly width: number
  readonly height: number
  readonly textSize: number
  readonly plot: Rect
  readonly x: AxisLayout
  readonly y: AxisLayout
  readonly lines: readonly LineLayout[]
  readonly marks: readonly MarkLayout[]
  /** Labels that found no free place in the plot, to be written below it. */
  readonly key: readonly KeyEntry[]
}

export type LayoutOptions = {
  readonly width: number
  readonly height: number
  /** Height of the type in layout units. */
  readonly textSize?: number
}
