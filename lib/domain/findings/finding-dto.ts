import 'server-only'

import type { Db, Tx } from '@/db/client'
import { listFindingActions, listFindingRunIds, type FindingRow } from '@/db/repositories/finding.repo'
import type { FindingConfidence, FindingSeverity } from '@/db/tables/findings'

import { loadRuns } from './run-resource'
import type { RunDto } from './run-dto'

/** A finding in a list. */
export type FindingHeading = {
  readonly findingId: string
  readonly engagementId: string
  readonly number: number
  readonly claim: string
  readonly severity: FindingSeverity
  readonly confidence: FindingConfidence
  readonly status: 'draft' | 'published'
  readonly author: string
  readonly createdAt: number
  readonly publishedAt: number | null
}

export type FindingActionDto = {
  readonly instruction: string
  readonly partValues: string
  readonly sideEffects: string
}

/** A finding with everything that it rests on: every number can be opened from here. */
export type FindingDto = FindingHeading & {
  readonly reasoning: string
  readonly alternativeCauses: string
  readonly disprovingExperiment: string
  readonly actions: readonly FindingActionDto[]
  /** In the order of the argument. */
  readonly runs: readonly RunDto[]
}

export const findingHeadingOf = (row: FindingRow): FindingHeading => ({
  findingId: row.id,
  engagementId: row.engagement_id,
  number: row.number,
  claim: row.claim,
  severity: row.severity,
  confidence: row.confidence,
  status: row.status,
  author: row.author,
  createdAt: row.created_at,
  publishedAt: row.published_at,
})

export async function findingOf(db: Db | Tx, row: FindingRow): Promise<FindingDto> {
  const actions = await listFindingActions(db, row.id)
  return {
    ...findingHeadingOf(row),
    reasoning: row.reasoning,
    alternativeCauses: row.alternative_causes,
    disprovingExperiment: row.disproving_experiment,
    actions: actions.map(({ instruction, part_values, side_effects }) => ({
      instruction,
      partValues: part_values,
      sideEffects: side_effects,
    })),
    runs: await loadRuns(db, await listFindingRunIds(db, row.id)),
  }
}
