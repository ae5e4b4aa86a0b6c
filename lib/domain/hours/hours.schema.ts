import { z } from 'zod'

import { idField, requiredText } from '../form-fields'

const workKind = z.enum(['measurement', 'analysis', 'layout_review', 'reporting', 'review', 'meeting'], {
  error: 'Choose the kind of work.',
})

const work = { workKind, text: requiredText('What was done', 1000) }

export const companyIdSchema = z.strictObject({ companyId: idField })

export const engagementIdSchema = z.strictObject({ engagementId: idField })

export const startTimerSchema = z.strictObject({ engagementId: idField, ...work })

export const addTimeSchema = z.strictObject({
  engagementId: idField,
  ...work,
  startedAt: z.iso
    .datetime({ local: true, error: 'Enter day and time, in UTC.' })
    .transform((text) => Date.parse(text.endsWith('Z') ? text : `${text}Z`)),
  workedMinutes: z.coerce
    .number({ error: 'Enter the minutes that were worked.' })
    .int('Enter whole minutes.')
    .min(1, 'Enter at least one minute.')
    .max(1440, 'One entry is at most 24 hours; split it.'),
})

export const timeEntryIdSchema = z.strictObject({ timeEntryId: idField })

export const editTimeSchema = z.strictObject({ timeEntryId: idField, ...work })
