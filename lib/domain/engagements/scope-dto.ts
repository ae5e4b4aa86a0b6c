import 'server-only'

import type { Db } from '@/db/client'
import { listScopes } from '@/db/repositories/scope.repo'
import type { ScopeStatus } from '@/db/tables/engagements'

export type ScopeDto = {
  readonly scopeId: string
  readonly version: number
  readonly body: string
  readonly capMinutes: number
  readonly status: ScopeStatus
  readonly author: string
  readonly proposedAt: number | null
  readonly decidedBy: string | null
  readonly decidedAt: number | null
  readonly decisionNote: string | null
}

/** The versions of a scope, newest first; drafts only for those who write them. */
export async function scopesFor(db: Db, engagementId: string, withDrafts: boolean): Promise<ScopeDto[]> {
  const rows = await listScopes(db, engagementId)
  return rows
    .filter((row) => withDrafts || row.status !== 'draft')
    .map((row) => ({
      scopeId: row.id,
      version: row.version,
      body: row.body,
      capMinutes: row.cap_minutes,
      status: row.status,
      author: row.author_name,
      proposedAt: row.proposed_at,
      decidedBy: row.decider_name,
      decidedAt: row.decided_at,
      decisionNote: row.decision_note,
    }))
}
