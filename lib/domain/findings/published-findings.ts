import 'server-only'

import type { Db, Tx } from '@/db/client'
import { listFindingsOf } from '@/db/repositories/finding.repo'

import { findingOf, type FindingDto } from './finding-dto'

/** The published findings of an engagement by number, with runs, figures, sources and evidence; drafts are left out. */
export async function publishedFindings(db: Db | Tx, engagementId: string): Promise<FindingDto[]> {
  const rows = await listFindingsOf(db, engagementId)
  const published = rows.filter((row) => row.status === 'published')
  return Promise.all(published.map((row) => findingOf(db, row)))
}
