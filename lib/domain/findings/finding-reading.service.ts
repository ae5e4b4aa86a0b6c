import 'server-only'

import { listFindingsOf } from '@/db/repositories/finding.repo'
import { isAllowed } from '@/lib/authz/authorize'
import { ok } from '@/lib/core/result'

import { engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { findingHeadingOf, findingOf } from './finding-dto'
import { findingFor } from './finding-resource'
import { engagementIdSchema, findingIdSchema } from './findings.schema'

/** The findings of an engagement by number: published ones for its client, drafts as well for its consultants. */
export const listFindings = operation('findings.list', engagementIdSchema, async (deps, actor, input) => {
  const engagement = await engagementFor(deps.db, actor, 'finding.readPublished', input.engagementId)
  if (!engagement.ok) return engagement
  const { resource } = engagement.value
  const mayReadDrafts = isAllowed(actor, 'finding.readDraft', resource)
  const rows = await listFindingsOf(deps.db, input.engagementId)
  return ok({
    mayWrite: isAllowed(actor, 'finding.write', resource),
    findings: rows.filter((row) => mayReadDrafts || row.status === 'published').map(findingHeadingOf),
  })
})

/** One finding with its runs, figures, sources and evidence. */
export const getFinding = operation('findings.get', findingIdSchema, async (deps, actor, input) => {
  const finding = await findingFor(deps.db, actor, 'finding.readPublished', input.findingId)
  if (!finding.ok) return finding
  const { row, engagement } = finding.value
  const mayWrite = isAllowed(actor, 'finding.write', engagement.resource)
  return ok({ ...(await findingOf(deps.db, row)), mayWrite })
})
