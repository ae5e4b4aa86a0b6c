import { z } from 'zod'

import { idField, optionalText, requiredText } from '../form-fields'
import { hoursField } from './hours-field'
import { optionalQuantity, quantityField } from './quantity-field'

const optionalDate = z.preprocess(
  (value) => (value === undefined || value === '' ? null : value),
  z.iso.date('Enter a date that the calendar has, as year-month-day.').nullable(),
)

const oscillator = z.strictObject({
  name: requiredText('The name of the oscillator', 120),
  frequency: quantityField('Hz', { positive: true }),
  tolerancePpm: z.preprocess(
    (value) =>
      typeof value === 'string'
        ? value
            .trim()
            .replace(/\s*ppm$/i, '')
            .replace(',', '.')
        : value,
    z.coerce
      .number('Enter the tolerance in ppm, such as 50.')
      .min(0, 'A tolerance is zero or more.')
      .max(1e6, 'A tolerance is at most 1,000,000 ppm.'),
  ),
})

/** A row of the form that was left empty altogether says nothing; it is dropped last, so that errors keep their row. */
const oscillatorOrEmpty = z.preprocess((row) => (isEmptyRow(row) ? null : row), oscillator.nullable())

const isEmptyRow = (row: unknown): boolean =>
  typeof row === 'object' && Object.values(row ?? {}).every((entry) => String(entry).trim() === '')

export const openEngagementSchema = z.strictObject({
  companyId: idField,
  title: requiredText('A title', 200),
  product: requiredText('The product', 500),
  goalStandard: optionalText('The standard', 200),
  goalClass: optionalText('The class', 100),
  goalTestDate: optionalDate,
  symptom: requiredText('The symptom', 5000),
  vin: optionalQuantity('V'),
  vout: optionalQuantity('V'),
  iout: optionalQuantity('A'),
  switchingFrequency: optionalQuantity('Hz', { positive: true }),
  spreadSpectrum: optionalText('Spread spectrum', 200),
  alreadyTried: optionalText('What was tried', 5000),
  oscillators: z
    .array(oscillatorOrEmpty)
    .max(20, 'At most 20 oscillators; name the ones nearest to the trouble.')
    .default([])
    .transform((rows) => rows.filter((row) => row !== null)),
})

export type OpenEngagement = z.output<typeof openEngagementSchema>

export const engagementIdSchema = z.strictObject({ engagementId: idField })

export const personOnEngagementSchema = z.strictObject({ engagementId: idField, personId: idField })

export const saveScopeSchema = z.strictObject({
  engagementId: idField,
  body: requiredText('The text of the scope', 20_000),
  capHours: hoursField('The hour cap'),
})

export const scopeIdSchema = z.strictObject({ scopeId: idField })

export const declineScopeSchema = z.strictObject({
  scopeId: idField,
  note: requiredText('A note on why', 2000),
})
