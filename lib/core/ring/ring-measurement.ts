export type StateLevels = { readonly base: number; readonly top: number }

/** Settled levels before (base) and after (top) the edge, so that base is the higher one of a falling edge. */
export type EdgeLevels = StateLevels & {
  /** The extreme beyond the top; the top itself where nothing beyond it stands above the noise. */
  readonly peak: number
}

export type Edge = {
  readonly direction: 'rising' | 'falling'
  /** When half of the way from base to top is reached. */
  readonly instantSeconds: number
  /** From 10 % to 90 % of the way from base to top. */
  readonly transitionSeconds: number
}

/** v(t) = level + amplitude · e^(−decayRate (t − start)) · cos(2π dampedFrequency (t − start) + phase). */
export type RingFit = {
  readonly startSeconds: number
  readonly endSeconds: number
  readonly level: number
  readonly amplitude: number
  /** Radians. */
  readonly phase: number
  /** Per second. */
  readonly decayRate: number
  /** Root mean square of what the fit leaves over. */
  readonly residualRms: number
}

export type Confidence = 'high' | 'medium' | 'low'

export type Ring = {
  readonly dampedFrequency: number
  readonly naturalFrequency: number
  readonly dampingRatio: number
  /** Natural logarithm of the ratio of two peaks of the same sign, one cycle apart. */
  readonly logDecrement: number
  readonly qualityFactor: number
  /** Cycles above the noise that the fit rests on. */
  readonly cyclesUsed: number
  readonly confidence: Confidence
  readonly fit: RingFit
}

/** What one edge and the ringing after it measure; plain numbers only, so that it can be stored as JSON. */
export type RingMeasurement = {
  readonly windowSeconds: readonly [number, number]
  readonly edge: Edge
  readonly levels: EdgeLevels
  /** (peak − top)/(top − base). */
  readonly overshootFraction: number
  /** True where the peak is cut off by the vertical range: the overshoot is at least this. */
  readonly overshootIsLowerBound: boolean
  readonly ring: Ring | null
  /** Why there is no ring, as a sentence; null where there is one. */
  readonly ringAbsence: string | null
  readonly warnings: readonly string[]
}

export type RingErrorCode = 'too_few_samples' | 'no_edge'

export type RingError = { readonly code: RingErrorCode; readonly message: string }

/** A trace of samples at a constant interval. */
export type Trace = {
  readonly values: Float64Array
  readonly startSeconds: number
  readonly intervalSeconds: number
}
