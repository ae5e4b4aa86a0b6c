import { z } from 'zod'

import { idField, optionalText, requiredText } from '../form-fields'

const severities = ['critical', 'major', 'minor', 'note'] as const
const confidences = ['high', 'medium', 'low'] as const

const action = z.strictObject({
  instruction: requiredText('What to do', 1000),
  partValues: optionalText('Parts and values', 1000),
  sideEffects: optionalText('Side effects', 1000),
})

/** A row of the form that was left empty altogether says nothing and is dropped. */
const withoutEmptyRows = (rows: unknown): unknown =>
  Array.isArray(rows)
    ? rows.filter((row: unknown) => Object.values(Object(row)).some((entry) => String(entry).trim() !== ''))
    : rows

const content = {
  claim: requiredText('The claim', 500),
  severity: z.enum(severities, { error: 'Choose how much it matters.' }),
  confidence: z.enum(confidences, { error: 'Choose how sure you are.' }),
  reasoning: optionalText('The reasoning', 10_000),
  alternativeCauses: optionalText('The other causes', 5000),
  disprovingExperiment: optionalText('The experiment', 5000),
  runIds: z
    .array(idField)
    .max(20, 'A finding rests on at most 20 runs; choose those that carry it.')
    .refine((ids) => new Set(ids).size === ids.length, 'Name each run once.')
    .default([]),
  actions: z.preprocess(
    withoutEmptyRows,
    z.array(action).max(20, 'At most 20 actions; name those that matter most.').default([]),
  ),
}

export const engagementIdSchema = z.strictObject({ engagementId: idField })

export const findingIdSchema = z.strictObject({ findingId: idField })

export const createFindingSchema = z.strictObject({ engagementId: idField, ...content })

export const editFindingSchema = z.strictObject({ findingId: idField, ...content })

export type FindingContent = Omit<z.output<typeof createFindingSchema>, 'engagementId'>
