/** One measured quantity of a capture, in SI units; the unit is empty where the file names none. */
export type CaptureChannel = {
  readonly name: string
  readonly unit: 'V' | 'A' | ''
  readonly values: Float64Array
}

/** A record of samples at a constant interval, as read from a file. */
export type Capture = {
  readonly startSeconds: number
  readonly intervalSeconds: number
  /** Where the interval comes from, as a sentence. */
  readonly intervalSource: string
  readonly samples: number
  readonly channels: readonly CaptureChannel[]
  readonly warnings: readonly string[]
}

export type CaptureErrorCode =
  'empty' | 'not_text' | 'no_numbers' | 'no_interval' | 'uneven_time' | 'bad_number'

/** Why a file cannot be read as a capture: what, where (row and column count from 1), and what to do. */
export type CaptureError = {
  readonly code: CaptureErrorCode
  readonly message: string
  readonly row?: number
  readonly column?: number
}
