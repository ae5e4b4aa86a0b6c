import type { z } from 'zod'

import { err, type Result } from '@/lib/core/result'

import type { Outputs, Topic } from '../topic'
import { topicOf } from '../topic-of'

/** What a topic answers, or the refusal of the core with its sentence. */
export type Answer = Result<Outputs, string | { readonly message: string }>

/** A topic of numbers only: refuses inputs whose results are out of the range of numbers. */
export const finiteTopic = <Inputs>(schema: z.ZodType<Inputs>, answer: (inputs: Inputs) => Answer): Topic =>
  topicOf(schema, (inputs) => {
    const answered = answer(inputs)
    if (!answered.ok) return err(typeof answered.error === 'string' ? answered.error : answered.error.message)
    const broken = Object.entries(answered.value).find(([, value]) => ![value].flat().every(Number.isFinite))
    return broken === undefined ? answered : err(`${broken[0]}: these inputs give no finite value`)
  })
