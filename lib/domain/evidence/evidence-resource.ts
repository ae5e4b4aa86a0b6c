import 'server-only'

import type { Db, Tx } from '@/db/client'
import { findCapture, listCaptureChannels } from '@/db/repositories/capture.repo'
import { listFacts } from '@/db/repositories/evidence-facts.repo'
import { findEvidence, type EvidenceRow } from '@/db/repositories/evidence.repo'
import type { Actor } from '@/lib/authz/actor'
import { notFound, type Denial } from '@/lib/authz/authorize'
import type { Action } from '@/lib/authz/policy'
import { err, ok, type Result } from '@/lib/core/result'

import { engagementFor, type LoadedEngagement } from '../engagements/engagement-resource'
import { factsOf, type CaptureFacts } from './capture-facts'

export type LoadedEvidence = { readonly row: EvidenceRow; readonly engagement: LoadedEngagement }

/** Loads a piece of evidence with its engagement and asks the policy; an unknown id and a foreign one look the same. */
export async function evidenceFor(
  db: Db | Tx,
  actor: Actor,
  action: Action,
  evidenceId: string,
): Promise<Result<LoadedEvidence, Denial>> {
  const row = await findEvidence(db, evidenceId)
  if (!row) return err(notFound)
  const engagement = await engagementFor(db, actor, action, row.engagement_id)
  return engagement.ok ? ok({ row, engagement: engagement.value }) : engagement
}

export type CaptureDto = {
  readonly samples: number
  readonly startSeconds: number
  readonly intervalSeconds: number
  readonly intervalSource: string
  readonly warnings: readonly string[]
  readonly channels: readonly {
    readonly position: number
    readonly name: string
    readonly unit: string
    readonly minimum: number
    readonly maximum: number
  }[]
  readonly facts: CaptureFacts
}

/** What was recognised in a capture and what was stated about it; undefined where no capture was read. */
export async function loadCapture(db: Db | Tx, evidenceId: string): Promise<CaptureDto | undefined> {
  const capture = await findCapture(db, evidenceId)
  if (!capture) return undefined
  const channels = await listCaptureChannels(db, evidenceId)
  return {
    samples: capture.samples,
    startSeconds: capture.start_seconds,
    intervalSeconds: capture.interval_seconds,
    intervalSource: capture.interval_source,
    warnings: warningsOf(capture.warnings),
    channels: channels.map(({ position, name, unit, minimum, maximum }) => ({
      position,
      name,
      unit,
      minimum,
      maximum,
    })),
    facts: factsOf(await listFacts(db, evidenceId)),
  }
}

function warningsOf(stored: string): string[] {
  const parsed: unknown = JSON.parse(stored)
  return Array.isArray(parsed) ? parsed.map(String) : []
}
