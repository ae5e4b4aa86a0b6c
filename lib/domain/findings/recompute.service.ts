import 'server-only'

import { ok } from '@/lib/core/result'

import { operation } from '../operation'
import { differenceOnRepeat } from './repeat-run'
import { readableRun } from './run-resource'
import { runIdSchema } from './runs.schema'

/** What a repetition of a run says about it. */
export type Recomputation = {
  readonly isSame: boolean
  readonly sentence: string
  readonly recomputedAt: number
}

/**
 * Repeats a run from its stored inputs and, for a measurement, from the bytes of its evidence. The stored run is left as
 * it is. Open to everybody who may read the run.
 */
export const recomputeRun = operation('runs.recompute', runIdSchema, async (deps, actor, input) => {
  const run = await readableRun(deps.db, actor, input.runId)
  if (!run.ok) return run
  const difference = await differenceOnRepeat(deps, run.value.row)
  const recomputation: Recomputation = {
    isSame: difference === null,
    sentence: difference ?? 'Computed again from the stored inputs and evidence: the same to the last digit.',
    recomputedAt: deps.clock.now(),
  }
  return ok(recomputation)
})
