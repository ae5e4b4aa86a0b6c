import { z } from 'zod'

import { optionalQuantity } from '../engagements/quantity-field'
import { idField } from '../form-fields'

export const engagementIdSchema = z.strictObject({ engagementId: idField })

export const runIdSchema = z.strictObject({ runId: idField })

export const measureRingSchema = z.strictObject({
  evidenceId: z.string().regex(/^[0-9a-z]{26}$/, 'Choose a capture.'),
  channel: z.coerce.number('Choose a channel.').int('Choose a channel.').min(0, 'Choose a channel.').max(63),
  from: optionalQuantity('s'),
  to: optionalQuantity('s'),
})

export type MeasureRing = z.output<typeof measureRingSchema>

const resultKey = z.string().regex(/^\w{1,40}$/, 'Choose a result from the list.')

const entry = z.string().max(60, 'Shorten this entry.').default('')

/** How far the value may be off, such as "5 %" or "0.2 pF"; empty means that nothing is said about it. */
const tolerance = entry

/** One value, the key of a choice, or the rows of a table. */
const text = z.string().max(500_000, 'Shorten this entry.').default('')

const typed = z.strictObject({ text, tolerance })

const picked = z.strictObject({ fromRun: idField, key: resultKey, tolerance })

/**
 * A form sends what was typed and, beside it, what was picked from a list as "run:result". What was picked counts, and
 * the text is dropped here: a picked value is read from the stored run alone.
 */
const fromForm = (value: unknown): unknown => {
  if (typeof value !== 'object' || value === null || !('pick' in value)) return value
  const { pick, ...rest } = value
  if (pick === '' || pick === undefined) return rest
  const [fromRun, key] = String(pick).split(':')
  const { text: _text, ...others } = { text: '', ...rest }
  return { ...others, fromRun, key }
}

export const runMethodSchema = z.strictObject({
  engagementId: idField,
  methodId: z.string().max(60),
  inputs: z.record(z.string().max(60), z.preprocess(fromForm, z.union([picked, typed]))).default({}),
})

export type GivenInput = z.output<typeof typed> | z.output<typeof picked>

export const methodIdSchema = z.strictObject({ methodId: z.string().max(60) })

export const openMethodSchema = z.strictObject({ engagementId: idField, methodId: z.string().max(60) })
