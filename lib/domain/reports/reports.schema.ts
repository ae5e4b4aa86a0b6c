import { z } from 'zod'

import { idField, optionalText, requiredText } from '../form-fields'

export const engagementIdSchema = z.strictObject({ engagementId: idField })

export const reportIdSchema = z.strictObject({ reportId: idField })

const content = {
  title: requiredText('The title', 200),
  belief: requiredText('What we believe', 2000),
  certainty: requiredText('How sure we are', 2000),
  nextStep: requiredText('What to do next', 2000),
  findingIds: z
    .array(idField, { error: 'Choose at least one finding.' })
    .min(1, 'Choose at least one finding.'),
}

export const createReportSchema = z.strictObject({ engagementId: idField, ...content })

export const editReportSchema = z.strictObject({ reportId: idField, ...content })

export const submitReportSchema = z.strictObject({
  reportId: idField,
  reviewerId: z.string().regex(/^[0-9a-z]{26}$/, 'Choose a reviewer.'),
})

export const remarkSchema = z.strictObject({
  reportId: idField,
  section: z.enum(['summary', 'question', 'evidence', 'findings', 'limits', 'methods'], {
    error: 'Choose the section that the remark is about.',
  }),
  text: requiredText('The remark', 4000),
})

export const signReportSchema = z.strictObject({
  reportId: idField,
  password: z.string().max(200),
  passphrase: z.string().max(200),
})

export const createCertificateSchema = z.strictObject({
  password: z.string().max(200),
  passphrase: z
    .string({ error: 'Choose a signing passphrase.' })
    .min(12, 'Choose at least 12 characters.')
    .max(200, 'Choose at most 200 characters.'),
})

export const checkCodeSchema = z.strictObject({ code: optionalText('The code', 40) })

export const checkFileSchema = z.strictObject({ bytes: z.instanceof(Uint8Array) })
