import 'server-only'

import type { Tx } from '@/db/client'
import { insertRun, nextRunNumber } from '@/db/repositories/method-run.repo'
import type { Actor } from '@/lib/authz/actor'

import type { Deps } from '../deps'
import type { RunInputs, RunOutcome } from './run-record'

export type RunEvidence = { readonly evidenceId: string; readonly sha256: string }

export type NewRun = {
  readonly engagementId: string
  readonly methodId: string
  readonly methodVersion: number
  readonly inputs: RunInputs
  readonly outcome: RunOutcome
  readonly evidence: readonly RunEvidence[]
}

export type StoredRun = { readonly runId: string; readonly engagementId: string; readonly number: number }

/** Writes a run under the next number of its engagement; from then on it is never changed. */
export async function storeRun(tx: Tx, deps: Deps, actor: Actor, run: NewRun): Promise<StoredRun> {
  const runId = deps.ids.newId()
  const number = await nextRunNumber(tx, run.engagementId)
  const { figures, ...result } = run.outcome
  await insertRun(
    tx,
    {
      id: runId,
      engagement_id: run.engagementId,
      number,
      method_id: run.methodId,
      method_version: run.methodVersion,
      inputs: JSON.stringify(run.inputs),
      result: JSON.stringify(result),
      figures: JSON.stringify(figures),
      created_by: actor.personId,
      created_at: deps.clock.now(),
    },
    run.evidence.map(({ evidenceId, sha256 }) => ({ evidence_id: evidenceId, sha256 })),
  )
  return { runId, engagementId: run.engagementId, number }
}
