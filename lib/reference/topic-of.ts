import type { z } from 'zod'

import { err, type Result } from '@/lib/core/result'

import type { CaptureReader, Outputs, Topic } from './topic'

/** A topic whose inputs have a schema; inputs that do not fit it are refused with what is wrong with them. */
export const topicOf =
  <Inputs>(
    schema: z.ZodType<Inputs>,
    answer: (inputs: Inputs, readCapture: CaptureReader) => Result<Outputs, string>,
  ): Topic =>
  (raw, readCapture) => {
    const parsed = schema.safeParse(raw)
    if (parsed.success) return answer(parsed.data, readCapture)
    const [issue] = parsed.error.issues
    return err(`${issue?.path.join('.') ?? 'inputs'}: ${issue?.message ?? 'not understood'}`)
  }
