/** A capture decimated to columns: the lowest and the highest sample of each, at rising instants in seconds. */
export type CapturePoints = {
  readonly x: readonly number[]
  readonly min: readonly number[]
  readonly max: readonly number[]
}

/** The tokens that traces are drawn in, in the order in which they are given out. */
export const traceTones = ['ink', 'copper', 'ink-faint', 'rule-strong'] as const

export type TraceTone = (typeof traceTones)[number]

/** One line of the plot: a channel, a difference of two, or a channel of another capture. */
export type CaptureTrace = {
  readonly key: string
  readonly label: string
  readonly unit: string
  readonly tone: TraceTone
  readonly points: CapturePoints
}

/** An instant that the page wants to point at. */
export type CaptureMarker = { readonly x: number; readonly label: string }
