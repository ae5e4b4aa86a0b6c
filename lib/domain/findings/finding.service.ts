import 'server-only'

import type { Tx } from '@/db/client'
import {
  insertFinding,
  listFindingRunIds,
  nextFindingNumber,
  replaceFindingActions,
  replaceFindingRuns,
  updateFinding,
  type FindingRow,
} from '@/db/repositories/finding.repo'
import { listRunsOf } from '@/db/repositories/method-run.repo'
import { withTx } from '@/db/tx'
import { err, ok } from '@/lib/core/result'

import type { Deps } from '../deps'
import { approvedCapOf, engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { findingFor } from './finding-resource'
import { alreadyPublished, noApprovedScope, noRun, notComplete, runNotHere } from './findings.errors'
import {
  createFindingSchema,
  editFindingSchema,
  findingIdSchema,
  type FindingContent,
} from './findings.schema'

/** Begins a finding as a draft, which the practice alone sees. */
export const createFinding = operation('findings.create', createFindingSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const { engagementId, ...content } = input
    const engagement = await engagementFor(tx, actor, 'finding.write', engagementId)
    if (!engagement.ok) return engagement
    if (!(await areRunsHere(tx, engagementId, content.runIds))) return err(runNotHere)
    const findingId = deps.ids.newId()
    await insertFinding(tx, {
      id: findingId,
      engagement_id: engagementId,
      number: await nextFindingNumber(tx, engagementId),
      ...columnsOf(content),
      status: 'draft',
      author_id: actor.personId,
      created_at: deps.clock.now(),
      published_at: null,
    })
    await replaceParts(tx, deps, findingId, content)
    return ok({ findingId, engagementId })
  }),
)

/** Changes a draft; a published finding stays as the client read it. */
export const editFinding = operation('findings.edit', editFindingSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const { findingId, ...content } = input
    const finding = await findingFor(tx, actor, 'finding.write', findingId)
    if (!finding.ok) return finding
    const { row } = finding.value
    if (row.status !== 'draft') return err(alreadyPublished)
    if (!(await areRunsHere(tx, row.engagement_id, content.runIds))) return err(runNotHere)
    await updateFinding(tx, findingId, columnsOf(content))
    await replaceParts(tx, deps, findingId, content)
    return ok({ findingId, engagementId: row.engagement_id })
  }),
)

/** Shows a complete draft to the client: it needs a run to rest on and work that the purchaser agreed to. */
export const publishFinding = operation('findings.publish', findingIdSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const finding = await findingFor(tx, actor, 'finding.write', input.findingId)
    if (!finding.ok) return finding
    const { row } = finding.value
    if (row.status !== 'draft') return err(alreadyPublished)
    if ((await approvedCapOf(tx, row.engagement_id)) === null) return err(noApprovedScope)
    if ((await listFindingRunIds(tx, row.id)).length === 0) return err(noRun)
    const missing = missingParts(row)
    if (Object.keys(missing).length > 0) return err(notComplete(missing))
    await updateFinding(tx, row.id, { status: 'published', published_at: deps.clock.now() })
    return ok({ findingId: row.id, engagementId: row.engagement_id })
  }),
)

const columnsOf = (content: FindingContent) => ({
  claim: content.claim,
  severity: content.severity,
  confidence: content.confidence,
  reasoning: content.reasoning,
  alternative_causes: content.alternativeCauses,
  disproving_experiment: content.disprovingExperiment,
})

async function replaceParts(tx: Tx, deps: Deps, findingId: string, content: FindingContent): Promise<void> {
  await replaceFindingRuns(tx, findingId, content.runIds)
  const actions = content.actions.map(({ instruction, partValues, sideEffects }, position) => ({
    id: deps.ids.newId(),
    finding_id: findingId,
    position,
    instruction,
    part_values: partValues,
    side_effects: sideEffects,
  }))
  await replaceFindingActions(tx, findingId, actions)
}

async function areRunsHere(tx: Tx, engagementId: string, runIds: readonly string[]): Promise<boolean> {
  const here = new Set((await listRunsOf(tx, engagementId)).map((run) => run.id))
  return runIds.every((runId) => here.has(runId))
}

/** What a finding owes its reader besides the claim. */
function missingParts(row: FindingRow): Readonly<Record<string, string>> {
  const missing: Record<string, string> = {}
  if (row.reasoning === '') missing['reasoning'] = 'Say how the runs lead to the claim.'
  if (row.alternative_causes === '') missing['alternativeCauses'] = 'Name the other causes it could have.'
  if (row.disproving_experiment === '') {
    missing['disprovingExperiment'] = 'Name the one experiment that would disprove it.'
  }
  return missing
}
