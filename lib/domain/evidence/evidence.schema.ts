import { z } from 'zod'

import { optionalQuantity } from '../engagements/quantity-field'
import { idField } from '../form-fields'
import { groundMethods } from './capture-facts'

export const engagementIdSchema = z.strictObject({ engagementId: idField })

export const evidenceIdSchema = z.strictObject({ evidenceId: idField })

const sentName = z
  .string({ error: 'The file needs a name.' })
  .max(4096, 'The file name is far too long; shorten it.')

export const announceUploadSchema = z.strictObject({
  engagementId: idField,
  name: sentName,
  sizeBytes: z.int().nonnegative(),
})

export const receiveEvidenceSchema = z.strictObject({
  engagementId: idField,
  name: sentName,
  contentLength: z.int().nonnegative().nullable(),
  body: z.custom<ReadableStream<Uint8Array>>((value) => value instanceof ReadableStream, {
    error: 'The upload has no body.',
  }),
})

const textFact = z
  .string()
  .trim()
  .max(500, 'At most 500 characters; shorten it.')
  .default('')
  .transform((text) => (text === '' ? null : text))

const attenuation = z.preprocess(
  (value) => (typeof value === 'string' ? value.trim().replace(/\s*(x|×|:\s*1)$/i, '') : value),
  optionalQuantity('', { positive: true }),
)

const groundMethod = z.preprocess(
  (value) => (value === undefined || value === '' ? null : value),
  z.enum(groundMethods, { error: 'Choose how the probe was grounded.' }).nullable(),
)

export const stateFactsSchema = z.strictObject({
  evidenceId: idField,
  bandwidthHertz: optionalQuantity('Hz', { positive: true }),
  probeAttenuation: attenuation,
  probeCapacitanceFarads: optionalQuantity('F', { positive: true }),
  groundMethod,
  groundLeadMetres: optionalQuantity('m', { positive: true }),
  probedAt: textFact,
  operatingCondition: textFact,
})

export const capturePointsSchema = z.strictObject({
  evidenceId: idField,
  channel: z.coerce.number().int().min(0).max(63).default(0),
  from: z.coerce.number().optional(),
  to: z.coerce.number().optional(),
  /** A channel of the same unit to be taken off, sample by sample. */
  minus: z.coerce.number().int().min(0).max(63).optional(),
  buckets: z.coerce.number().int().min(100).max(4000).default(1000),
})
