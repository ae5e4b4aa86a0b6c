/** A measure taken at several edges: their median, and how far they spread. */
export type Pooled = {
  readonly median: number
  /** Standard deviation over the edges; 0 for a single one. */
  readonly spread: number
  /** How many edges it was taken at. */
  readonly edges: number
}

/** A value with the bounds between which it lies with 95 % confidence. */
export type Interval = { readonly value: number; readonly low: number; readonly high: number }

/** The ring after the edges of a record. */
export type PooledRing = {
  /** f_d, in Hz: the imaginary part of the pole pair over 2π. */
  readonly dampedFrequency: Interval
  /** f_n = f_d/√(1 − ζ²), in Hz. */
  readonly naturalFrequency: number
  readonly dampingRatio: Interval
  /** How many edges were fitted, and how many of those that were tried showed a ring. */
  readonly edgesUsed: number
  readonly edgesTried: number
  /** Median of the cycles above the noise that the fits rest on. */
  readonly cyclesUsed: number
  readonly confidence: 'high' | 'medium' | 'low'
  /** How sure it is, and on how many edges it rests, as a sentence. */
  readonly statement: string
}

export type Overshoot = {
  /** (peak − top)/(top − base), measured; at least this where the peaks are cut off. */
  readonly fraction: number
  readonly spread: number
  readonly isLowerBound: boolean
  /** Where the peaks are cut off: what the ring, fitted after the cut-off part, had as its first peak; else null. */
  readonly reconstructed: number | null
  /** The extreme level, of the first edge of a step and of the typical one of a train. */
  readonly peakLevel: number
}

/** What a two-state record repeats. */
export type Period = {
  readonly seconds: number
  /** 1/period, in Hz. */
  readonly fundamental: number
  /** Root mean square of how far edges lie off their places, in seconds. */
  readonly jitterSeconds: number
  /** Part of the period above the middle between the levels. */
  readonly duty: number
  /** How many periods the record spans from its first edge to its last. */
  readonly periods: number
}

export type Harmonic = {
  readonly order: number
  /** In Hz. */
  readonly frequency: number
  /** Peak value, in the unit of the record. */
  readonly amplitude: number
  /** In dBµV rms where the record is in volts; null where the harmonic does not stand above the noise. */
  readonly level: number | null
}

export type Harmonics = {
  readonly list: readonly Harmonic[]
  /** A sine with less than this peak value cannot be told from the noise. */
  readonly floorAmplitude: number
  /** The same in dBµV rms. */
  readonly floorLevel: number
}

export type CaptureTone = { readonly frequency: number; readonly amplitude: number; readonly level: number }

export type Tones = { readonly list: readonly CaptureTone[]; readonly floorLevel: number }

/** What a record of edges between two states shows. */
export type TwoStates = {
  /** One edge, a few edges that repeat nothing, or a train. */
  readonly kind: 'step' | 'pulses' | 'train'
  /** Levels before and after the first edge of a step or of pulses; the low and the high one of a train. */
  readonly base: number
  readonly top: number
  /** |top − base|. */
  readonly amplitude: number
  readonly direction: 'rising' | 'falling'
  readonly risingEdges: number
  readonly fallingEdges: number
  /** When the first edge passes the middle, in seconds. */
  readonly firstEdgeSeconds: number
  /** 10 to 90 % of rising edges, 90 to 10 % of falling ones, in seconds; null where there is no such edge. */
  readonly riseTime: Pooled | null
  readonly fallTime: Pooled | null
  readonly overshoot: Overshoot
  readonly ring: PooledRing | null
  /** Why there is no ring, as a sentence; null where there is one. */
  readonly ringAbsence: string | null
  readonly period: Period | null
  readonly harmonics: Harmonics | null
}

export type CaptureAnalysis = {
  readonly minimum: number
  readonly maximum: number
  readonly mean: number
  /** Root mean square about the mean. */
  readonly deviation: number
  /** The step of the converter, where the values have steps; else 0. */
  readonly converterStep: number
  /** Null where the record does not rest at two levels. */
  readonly states: TwoStates | null
  /** The sines of a record without two states; null for one with, and where no tone stands above the noise. */
  readonly tones: Tones | null
  readonly warnings: readonly string[]
}

export type CaptureAnalysisErrorCode = 'too_few_samples' | 'value_not_finite' | 'interval_not_positive'

export type CaptureAnalysisError = { readonly code: CaptureAnalysisErrorCode; readonly message: string }
