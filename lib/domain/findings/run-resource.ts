import 'server-only'

import type { Db, Tx } from '@/db/client'
import { isRunPublished } from '@/db/repositories/finding.repo'
import { findRun, listRunEvidence, type RunRow } from '@/db/repositories/method-run.repo'
import type { Actor } from '@/lib/authz/actor'
import { isAllowed, notFound, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import { engagementFor, type LoadedEngagement } from '../engagements/engagement-resource'
import { runOf, type RunDto } from './run-dto'

export type LoadedRun = { readonly row: RunRow; readonly engagement: LoadedEngagement }

/**
 * Loads a run for somebody who may read it: the consultants of the engagement, and its client once the run stands in a
 * published finding. Before that a client gets the answer for an unknown id.
 */
export async function readableRun(
  db: Db | Tx,
  actor: Actor,
  runId: string,
): Promise<Result<LoadedRun, Denial>> {
  const row = await findRun(db, runId)
  if (!row) return err(notFound)
  const engagement = await engagementFor(db, actor, 'finding.readPublished', row.engagement_id)
  if (!engagement.ok) return engagement
  const mayReadAll = isAllowed(actor, 'run.read', engagement.value.resource)
  if (!mayReadAll && !(await isRunPublished(db, runId))) return err(notFound)
  return ok({ row, engagement: engagement.value })
}

export async function loadRun(db: Db | Tx, row: RunRow): Promise<RunDto> {
  return runOf(row, await listRunEvidence(db, [row.id]))
}

/** Runs in the order of their ids in the list; one that is not there is a broken reference. */
export async function loadRuns(db: Db | Tx, runIds: readonly string[]): Promise<RunDto[]> {
  const evidence = await listRunEvidence(db, runIds)
  const runs: RunDto[] = []
  for (const runId of runIds) {
    const row = await findRun(db, runId)
    if (!row) throw new Error(`A finding names the missing run ${runId}`)
    runs.push(runOf(row, evidence))
  }
  return runs
}
