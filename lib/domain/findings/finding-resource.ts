import 'server-only'

import type { Db, Tx } from '@/db/client'
import { findFinding, type FindingRow } from '@/db/repositories/finding.repo'
import type { Actor } from '@/lib/authz/actor'
import { isAllowed, notFound, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import { engagementFor, type LoadedEngagement } from '../engagements/engagement-resource'

export type LoadedFinding = { readonly row: FindingRow; readonly engagement: LoadedEngagement }

/** Loads a finding for reading or writing; to a client a draft is the same as an unknown id, whatever is asked of it. */
export async function findingFor(
  db: Db | Tx,
  actor: Actor,
  action: 'finding.readPublished' | 'finding.write',
  findingId: string,
): Promise<Result<LoadedFinding, Denial>> {
  const row = await findFinding(db, findingId)
  if (!row) return err(notFound)
  const readable = await engagementFor(db, actor, 'finding.readPublished', row.engagement_id)
  if (!readable.ok) return readable
  const { resource } = readable.value
  if (row.status === 'draft' && !isAllowed(actor, 'finding.readDraft', resource)) return err(notFound)
  const engagement = await engagementFor(db, actor, action, row.engagement_id)
  return engagement.ok ? ok({ row, engagement: engagement.value }) : engagement
}
