import 'server-only'

import { insertCapture } from '@/db/repositories/capture.repo'
import {
  listUncheckedEvidence,
  markEvidenceReady,
  markEvidenceRefused,
} from '@/db/repositories/evidence.repo'
import { withTx } from '@/db/tx'
import type { CaptureSummary } from '@/lib/ports/capture-analyser'

import type { Deps } from '../deps'

export type CheckOutcome = { readonly status: 'ready' | 'refused'; readonly refusal: string | null }

type CheckDeps = Pick<Deps, 'db' | 'captures'>

/** Reads a capture that was taken in and records what was recognised, or the sentence that says why it cannot be read. */
export async function checkCapture(deps: CheckDeps, evidenceId: string): Promise<CheckOutcome> {
  const analysis = await deps.captures.analyse(evidenceId)
  if (!analysis.ok) {
    await withTx(deps.db, (tx) => markEvidenceRefused(tx, evidenceId, analysis.error.message))
    return { status: 'refused', refusal: analysis.error.message }
  }
  await withTx(deps.db, async (tx) => {
    await insertCapture(tx, captureRow(evidenceId, analysis.value), channelRows(evidenceId, analysis.value))
    await markEvidenceReady(tx, evidenceId)
  })
  return { status: 'ready', refusal: null }
}

/**
 * Takes up the checks that a stop of the portal cut off; meant for its start. A file whose check fails again in a way
 * that nobody expected is marked as not readable, so that it cannot keep the portal from starting.
 */
export async function finishInterruptedChecks(deps: CheckDeps): Promise<number> {
  const unchecked = await listUncheckedEvidence(deps.db)
  for (const { id } of unchecked) {
    try {
      await checkCapture(deps, id)
    } catch {
      await withTx(deps.db, (tx) => markEvidenceRefused(tx, id, checkFailed))
    }
  }
  return unchecked.length
}

const checkFailed =
  'The check of this file was cut off twice on our side. The file is kept; tell the practice, or send it again.'

const captureRow = (evidenceId: string, summary: CaptureSummary) => ({
  evidence_id: evidenceId,
  samples: summary.samples,
  start_seconds: summary.startSeconds,
  interval_seconds: summary.intervalSeconds,
  interval_source: summary.intervalSource,
  warnings: JSON.stringify(summary.warnings),
})

const channelRows = (evidenceId: string, summary: CaptureSummary) =>
  summary.channels.map((channel, position) => ({ evidence_id: evidenceId, position, ...channel }))
