import { byteSizeInWords } from '@/lib/core/byte-size'

import type { ServiceError } from '../service-error'

export type EvidenceError = ServiceError<
  | 'name_not_usable'
  | 'kind_not_accepted'
  | 'too_large'
  | 'empty_file'
  | 'length_needed'
  | 'length_mismatch'
  | 'interrupted'
  | 'no_space'
  | 'engagement_full'
  | 'content_differs'
  | 'not_a_capture'
  | 'no_such_channel'
  | 'not_a_voltage'
  | 'part_too_long'
  | 'units_differ'
>

export const nameNotUsable = (message: string): EvidenceError => ({ code: 'name_not_usable', message })

export const kindNotAccepted = (name: string, accepted: string): EvidenceError => ({
  code: 'kind_not_accepted',
  message: `“${name}” is not of a kind that is taken in. These are: ${accepted}. Put anything else into a ZIP.`,
})

export const contentDiffers = (message: string): EvidenceError => ({ code: 'content_differs', message })

export const tooLarge = (sizeBytes: number, limitBytes: number, what: string): EvidenceError => ({
  code: 'too_large',
  message: `The file has ${byteSizeInWords(sizeBytes)}; ${what} may have at most ${byteSizeInWords(limitBytes)}. Split or shorten it.`,
})

export const emptyFile: EvidenceError = {
  code: 'empty_file',
  message: 'The file is empty. Export it again, check that it has a size, then send it.',
}

export const lengthNeeded: EvidenceError = {
  code: 'length_needed',
  message: 'The upload does not say how long the file is (Content-Length). Send it with its length.',
}

export const lengthMismatch = (announced: number): EvidenceError => ({
  code: 'length_mismatch',
  message: `The upload did not have the ${announced} bytes that it announced, so nothing was kept. Send the file again.`,
})

export const interrupted: EvidenceError = {
  code: 'interrupted',
  message: 'The upload broke off before its end, so nothing was kept. Send the file again.',
}

export const noSpace: EvidenceError = {
  code: 'no_space',
  message:
    'The practice’s disk is full, so nothing was kept. Tell the practice, then send the file again later.',
}

export const engagementFull = (message: string): EvidenceError => ({ code: 'engagement_full', message })

export const notACapture: EvidenceError = {
  code: 'not_a_capture',
  message:
    'This piece of evidence is not a capture that was read, so it has neither channels nor facts to state.',
}

export const noSuchChannel = (channel: number): EvidenceError => ({
  code: 'no_such_channel',
  message: `The capture has no channel ${channel + 1}.`,
})

export const notAVoltage = (channel: string): EvidenceError => ({
  code: 'not_a_voltage',
  message: `“${channel}” is not in volts, and levels in dBµV are of voltages. Choose a channel in volts.`,
})

export const partTooLong = (most: number): EvidenceError => ({
  code: 'part_too_long',
  message: `At most ${most.toLocaleString('en')} samples are transformed at once. Zoom in to a shorter part of the record.`,
})

export const unitsDiffer = (one: string, other: string): EvidenceError => ({
  code: 'units_differ',
  message: `“${one}” and “${other}” are of different quantities, so neither can be taken off the other.`,
})
