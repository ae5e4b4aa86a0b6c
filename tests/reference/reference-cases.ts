import { readFileSync } from 'node:fs'

import { expect } from 'vitest'
import { z } from 'zod'

const caseSchema = z.object({
  id: z.string(),
  topic: z.string(),
  inputs: z.record(z.string(), z.unknown()),
  expected: z.record(z.string(), z.unknown()),
  tolerance_rel: z.number(),
  tolerance_rel_by_output: z.record(z.string(), z.number()).default({}),
  tolerance_abs_by_output: z.record(z.string(), z.number()).default({}),
  how_computed: z.string(),
  expect_error: z.boolean().default(false),
})

/** A result that was computed outside the project, with the means by which it was computed. */
export type ReferenceCase = z.infer<typeof caseSchema>

/** The cases of one topic. */
export function referenceCases(topic: string): ReferenceCase[] {
  const text = readFileSync(new URL('./open-cases.json', import.meta.url), 'utf8')
  const { cases } = z.object({ cases: z.array(z.looseObject({ topic: z.string() })) }).parse(JSON.parse(text))
  const found = cases.filter((item) => item.topic === topic)
  if (found.length === 0) throw new Error(`No reference case about ${topic}`)
  // A capture has tolerances of another form, so that only the cases that are wanted are read whole.
  return z.array(caseSchema).parse(found)
}

/** Compares what was got with what is expected of a case, each output within its own tolerance. */
export function expectWithin(item: ReferenceCase, got: Readonly<Record<string, number>>): void {
  for (const [key, value] of Object.entries(got)) {
    const expected = z.number().parse(item.expected[key])
    const relative = item.tolerance_rel_by_output[key] ?? item.tolerance_rel
    const tolerance = item.tolerance_abs_by_output[key] ?? relative * Math.abs(expected) + 1e-300
    const difference = Math.abs(value - expected)
    expect(difference, `${item.id} ${key}: ${value} for ${expected}`).toBeLessThanOrEqual(tolerance)
  }
}

/** A number among the inputs of a case. */
export function input(item: ReferenceCase, key: string): number {
  return z.number().parse(item.inputs[key])
}
