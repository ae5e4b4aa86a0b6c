/**
 * A figure as data: what the screen, the report PDF and a table of values are all drawn from.
 * Values are in SI units; the renderer writes engineering notation at the axis.
 */
export type Scale = 'linear' | 'log'

export type Axis = {
  readonly label: string
  /** SI unit symbol ("s", "Hz", "V") or a decibel unit ("dBµV"); empty for a pure number. */
  readonly unit: string
  readonly scale: Scale
  /** Range to show; absent means the extent of the data. */
  readonly range?: readonly [number, number]
}

/** The role a line plays decides its look; a figure never names colours. */
export type SeriesRole = 'measured' | 'computed' | 'reference' | 'limit'

export type Series = {
  readonly id: string
  readonly label: string
  readonly role: SeriesRole
  readonly x: readonly number[]
  readonly y: readonly number[]
}

/** A value marked on the plot: a level line, a time, or a point with a short text written beside it. */
export type Mark =
  | { readonly kind: 'level'; readonly y: number; readonly label: string }
  | { readonly kind: 'instant'; readonly x: number; readonly label: string }
  | { readonly kind: 'point'; readonly x: number; readonly y: number; readonly label: string }

export type Figure = {
  readonly id: string
  readonly title: string
  /** One sentence for people who cannot see the plot: what it shows and the main value. */
  readonly description: string
  readonly x: Axis
  readonly y: Axis
  readonly series: readonly Series[]
  readonly marks: readonly Mark[]
}
