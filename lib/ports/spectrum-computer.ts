import type { Result } from '@/lib/core/result'

export type SpectrumRequest = {
  /** Identifier in the file store of the samples: IEEE 754 binary64, little-endian. */
  readonly fileId: string
  readonly first: number
  readonly count: number
  readonly intervalSeconds: number
  /** Of one of the windows by their coefficients. */
  readonly windowId: string
}

/** A spectrum thinned for drawing: in each column the strongest line, with its own frequency. */
export type ThinnedSpectrum = {
  readonly frequencies: readonly number[]
  /** In dBµV, rms. */
  readonly levels: readonly number[]
  readonly binWidth: number
  readonly resolutionBandwidth: number
  readonly windowName: string
  readonly isWholePeriods: boolean
  readonly sampleCount: number
}

export type SpectrumRefusal = { readonly code: 'not_computable' | 'took_too_long'; readonly message: string }

/** Computes spectra of stored samples away from the request loop. */
export type SpectrumComputer = {
  readonly compute: (request: SpectrumRequest) => Promise<Result<ThinnedSpectrum, SpectrumRefusal>>
}

/** The longest part of a record that is transformed at once. */
export const mostSpectrumSamples = 4_194_304
