import { durationText } from '@/lib/core/ledger/duration-text'

import type { ServiceError } from '../service-error'

export type HoursError = ServiceError<
  | 'timer_running'
  | 'no_timer'
  | 'already_posted'
  | 'no_scope'
  | 'cap_exceeded'
  | 'insufficient_hours'
  | 'not_in_the_past'
  | 'overlaps'
>

export const timerRunning = (engagement: string): HoursError => ({
  code: 'timer_running',
  message: `Your timer runs already, on “${engagement}”. Stop it first, then start the next.`,
})

export const noTimer: HoursError = {
  code: 'no_timer',
  message: 'No timer of yours is running. It may have been stopped in another tab.',
}

export const alreadyPosted: HoursError = {
  code: 'already_posted',
  message: 'This time was posted already and is never edited. A correction is a reversal.',
}

export const noScope: HoursError = {
  code: 'no_scope',
  message:
    'No scope of this engagement is approved, so no time can be posted. Propose one; the purchaser approves it.',
}

export const capExceeded = (wanted: number, left: number): HoursError => ({
  code: 'cap_exceeded',
  message: `These ${durationText(wanted)} go past the approved cap: ${durationText(left)} are left under it. Propose a scope with a higher cap, or post less.`,
})

export const insufficientHours = (needed: number, available: number): HoursError => ({
  code: 'insufficient_hours',
  message: `The client has ${durationText(available)} in valid blocks and ${durationText(needed)} are needed. Nothing was posted; ask the purchaser to buy hours, then post again.`,
})

export const notInThePast: HoursError = {
  code: 'not_in_the_past',
  message: 'Time is entered after it was worked.',
  fields: { startedAt: 'This work would end in the future.' },
}

/** `from` and `to` are UTC milliseconds of the time that is in the way. */
export const overlaps = (engagement: string, from: number, to: number): HoursError => ({
  code: 'overlaps',
  message: `You worked on “${engagement}” from ${minuteText(from)} to ${minuteText(to)} UTC already, and time counts once. Change the start or the length of this entry.`,
  fields: { startedAt: 'Overlaps with other time of yours.' },
})

const minuteText = (instant: number): string => new Date(instant).toISOString().slice(0, 16).replace('T', ' ')
