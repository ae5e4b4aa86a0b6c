import { z } from 'zod'

const captureTolerance = z.looseObject({
  not_required: z.array(z.string()).default([]),
  ring_frequency_rel: z.number().optional(),
  damping_ratio_rel: z.number().optional(),
  rise_time_rel: z.number().optional(),
  overshoot_abs: z.number().optional(),
  fundamental_rel: z.number().optional(),
  duty_abs: z.number().optional(),
  harmonic_db: z.number().optional(),
  harmonic_min_dbuv: z.number().optional(),
  harmonic_max_f: z.number().optional(),
  f_rel: z.number().optional(),
  level_db: z.number().optional(),
})

const truth = z.record(z.string(), z.unknown())

const referenceCase = z.object({
  id: z.string(),
  topic: z.string(),
  inputs: z.unknown(),
  expected: truth,
  tolerance_rel: z.number().nullish(),
  tolerance_rel_by_output: z.record(z.string(), z.number()).default({}),
  tolerance_abs_by_output: z.record(z.string(), z.number()).default({}),
  /** Of a capture: its measures have tolerances of their own. */
  tolerance: captureTolerance.optional(),
  expect_error: z.boolean().default(false),
})

/** The truth that lies beside a capture. */
const captureDescription = z.object({ file: z.string(), tolerance: captureTolerance, truth })

const caseFile = z.object({ cases: z.array(referenceCase) })

/** A result that was computed by other means, and how near to it the core has to come. */
export type ReferenceCase = z.output<typeof referenceCase>
export type CaptureTolerance = z.output<typeof captureTolerance>

export const parseCaseFile = (text: string): readonly ReferenceCase[] =>
  caseFile.parse(JSON.parse(text)).cases

/** A described capture as a case of the topic of captures. */
export function caseOfDescription(text: string): ReferenceCase {
  const described = captureDescription.parse(JSON.parse(text))
  return {
    id: described.file,
    topic: 'capture.analysis',
    inputs: { file: described.file },
    expected: described.truth,
    tolerance_rel_by_output: {},
    tolerance_abs_by_output: {},
    tolerance: described.tolerance,
    expect_error: false,
  }
}
