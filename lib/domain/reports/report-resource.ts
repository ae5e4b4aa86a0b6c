import 'server-only'

import type { Db, Tx } from '@/db/client'
import { findReport, type ReportRow } from '@/db/repositories/report.repo'
import type { Actor } from '@/lib/authz/actor'
import { notFound, type Denial } from '@/lib/authz/authorize'
import type { Action } from '@/lib/authz/policy'
import { err, ok, type Result } from '@/lib/core/result'

import { engagementFor, type LoadedEngagement } from '../engagements/engagement-resource'

export type LoadedReport = { readonly row: ReportRow; readonly engagement: LoadedEngagement }

/** Loads a report with its engagement and asks the policy. */
export async function reportFor(
  db: Db | Tx,
  actor: Actor,
  action: Action,
  reportId: string,
): Promise<Result<LoadedReport, Denial>> {
  const row = await findReport(db, reportId)
  if (!row) return err(notFound)
  const engagement = await engagementFor(db, actor, action, row.engagement_id)
  return engagement.ok ? ok({ row, engagement: engagement.value }) : engagement
}
