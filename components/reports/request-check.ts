import { z } from '../shell/plain-zod'

const answerSchema = z.object({
  outcome: z.enum(['valid', 'invalid', 'unknown']),
  sha256: z.string(),
  authorityFingerprint: z.string().nullable(),
  report: z
    .object({
      number: z.string(),
      revision: z.number(),
      standing: z.enum(['current', 'withdrawn']),
      releasedAt: z.number(),
    })
    .nullable(),
  signatures: z.array(
    z.object({
      field: z.string(),
      signerName: z.string().nullable(),
      signedAt: z.number().nullable(),
      reason: z.string().nullable(),
      passed: z.boolean(),
    }),
  ),
  problems: z.array(z.string()),
})

export type CheckAnswer = z.infer<typeof answerSchema>

const problemSchema = z.object({ title: z.string() })

/** Sends a file to be checked; throws an error whose message is the sentence to show. */
export async function requestCheck(file: File): Promise<CheckAnswer> {
  const response = await fetch('/api/check', { method: 'POST', body: file }).catch(() => null)
  if (!response) throw new Error('The file did not reach us. Check the connection and try again.')
  const body: unknown = await response.json().catch(() => null)
  if (response.ok) return answerSchema.parse(body)
  const problem = problemSchema.safeParse(body)
  throw new Error(problem.success ? problem.data.title : 'The file could not be checked. Try again.')
}
