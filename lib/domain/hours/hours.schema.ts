import { z } from 'zod'

import { idField, requiredText } from '../form-fields'

const workKind = z.enum(['measurement', 'analysis', 'layout_review', 'reporting', 'review', 'meeting'], {
  error: 'Choose the kind of work.',
})

const work = { workKind, text: requiredText('What was done', 1000) }

/** Times of day are UTC throughout, so that no night has two two-o'clocks. */
const span = {
  startedAt: z.iso
    .datetime({ local: true, error: 'Enter day and time, in UTC.' })
    .transform((text) => Date.parse(text.endsWith('Z') ? text : `${text}Z`)),
  workedMinutes: z
    .string({ error: 'Enter the minutes that were worked.' })
    .trim()
    .regex(/^\d{1,5}$/, 'Enter whole minutes, such as 45.')
    .transform(Number)
    .refine((minutes) => minutes >= 1, 'Enter at least one minute.')
    .refine((minutes) => minutes <= 1440, 'One entry is at most 24 hours (1440 min); split it.'),
}

export const companyIdSchema = z.strictObject({ companyId: idField })

export const engagementIdSchema = z.strictObject({ engagementId: idField })

export const startTimerSchema = z.strictObject({ engagementId: idField, ...work })

export const addTimeSchema = z.strictObject({ engagementId: idField, ...work, ...span })

export const timeEntryIdSchema = z.strictObject({ timeEntryId: idField })

export const editTimeSchema = z.strictObject({ timeEntryId: idField, ...work, ...span })
