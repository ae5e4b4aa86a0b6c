/** A capture decimated to columns: the lowest and the highest sample of each, at rising instants in seconds. */
export type CapturePoints = {
  readonly x: readonly number[]
  readonly min: readonly number[]
  readonly max: readonly number[]
}

/** An instant that the page wants to point at. */
export type CaptureMarker = { readonly x: number; readonly label: string }
