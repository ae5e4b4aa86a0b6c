import type { MethodError } from '@/lib/core/method/method'
import type { RingError } from '@/lib/core/ring/ring-measurement'

import type { ServiceError } from '../service-error'

export type RunError = ServiceError<
  | 'not_a_capture'
  | 'no_such_channel'
  | 'window_reversed'
  | 'window_too_long'
  | 'nothing_to_measure'
  | 'no_such_method'
  | 'inputs_refused'
>

export const notACapture: RunError = {
  code: 'not_a_capture',
  message: 'This piece of evidence is not a capture that was read, so there is nothing to measure in it.',
  fields: { evidenceId: 'Choose a capture.' },
}

export const noSuchChannel: RunError = {
  code: 'no_such_channel',
  message: 'The capture does not have this channel.',
  fields: { channel: 'Choose a channel of this capture.' },
}

export const windowReversed: RunError = {
  code: 'window_reversed',
  message: 'The window ends before it begins.',
  fields: { to: 'Enter an instant after the begin of the window.' },
}

export const windowTooLong = (samples: number, most: number): RunError => ({
  code: 'window_too_long',
  message: `The window holds ${samples} samples; at most ${most} are measured at once.`,
  fields: { to: 'Choose a shorter window: from just before the edge to just before the next one.' },
})

/** The record was read, and it holds no edge: an answer about the window, so it is said at the window. */
export const nothingToMeasure = (error: RingError): RunError => ({
  code: 'nothing_to_measure',
  message: error.message,
  fields: { from: error.message },
})

export const noSuchMethod: RunError = {
  code: 'no_such_method',
  message: 'The practice has no method under this name. Choose one on the bench.',
}

export const inputsRefused = (error: MethodError, fields: Readonly<Record<string, string>>): RunError => ({
  code: 'inputs_refused',
  message: error.message,
  ...(Object.keys(fields).length > 0 ? { fields } : {}),
})
