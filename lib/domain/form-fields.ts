import { z } from 'zod'

/** Input shapes shared by forms and the interface; every message says what to do. */
export const requiredText = (label: string, max: number) =>
  z
    .string({ error: `${label} is needed.` })
    .trim()
    .min(1, `${label} is needed.`)
    .max(max, `${label} can have at most ${max} characters; shorten it.`)

export const optionalText = (label: string, max: number) =>
  z.string().trim().max(max, `${label} can have at most ${max} characters; shorten it.`).default('')

export const idField = z.string().regex(/^[0-9a-z]{26}$/, 'This is not one of our identifiers.')

export const noInput = z.strictObject({})
