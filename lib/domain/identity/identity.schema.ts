import { z } from 'zod'

import { idField, requiredText } from '../form-fields'
import { emailField } from './email-address'
import { identityLimits } from './limits'

const token = z
  .string()
  .regex(/^[A-Za-z0-9_-]{43}$/, 'This link is incomplete; open it again from the message.')

const newPassword = z
  .string({ error: 'Choose a password.' })
  .min(identityLimits.passwordLength, `Choose at least ${identityLimits.passwordLength} characters.`)
  .max(200, 'Choose at most 200 characters.')

export const signInSchema = z.strictObject({ email: z.string().max(300), password: z.string().max(200) })

export const inviteCompanySchema = z.strictObject({
  companyName: requiredText('The company name', 200),
  email: emailField,
})

export const inviteColleagueSchema = z.strictObject({
  companyId: idField,
  email: emailField,
  role: z.enum(['purchaser', 'engineer'], { error: 'Choose a role.' }),
})

export const inviteStaffSchema = z.strictObject({
  email: emailField,
  role: z.enum(['consultant', 'administrator'], { error: 'Choose a role.' }),
})

export const invitationTokenSchema = z.strictObject({ token })

export const askForResetSchema = z.strictObject({ email: emailField })

export const setPasswordSchema = z.strictObject({
  token,
  name: z.string().trim().max(200).default(''),
  password: newPassword,
})

export const acceptTermsSchema = z.strictObject({
  companyId: idField,
  version: z.coerce.number().int().positive(),
  typedName: requiredText('Your full name', 200),
})

export const personIdSchema = z.strictObject({ personId: idField })

export const companyIdSchema = z.strictObject({ companyId: idField })
