import 'server-only'

import type { Tx } from '@/db/client'
import {
  countReportNumbers,
  insertReport,
  moveReport,
  replaceReportFindings,
} from '@/db/repositories/report.repo'
import { withTx } from '@/db/tx'
import { err, ok } from '@/lib/core/result'

import { engagementFor } from '../engagements/engagement-resource'
import { publishedFindings } from '../findings/published-findings'
import { operation } from '../operation'
import { newCheckCode } from './check-code'
import { freezeReport } from './freeze-report'
import { reportFor } from './report-resource'
import { reportSteps } from './report-steps'
import { findingNotPublished, notTheAuthor, reviewerNotPossible, stepNotOpen } from './reports.errors'
import { createReportSchema, editReportSchema, submitReportSchema } from './reports.schema'

/** Begins a report as a draft of its author, with a number of the practice's own series. */
export const createReport = operation('reports.create', createReportSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const engagement = await engagementFor(tx, actor, 'report.compose', input.engagementId)
    if (!engagement.ok) return engagement
    if (!(await areAllPublished(tx, input.engagementId, input.findingIds))) return err(findingNotPublished)
    const now = deps.clock.now()
    const reportId = deps.ids.newId()
    await insertReport(tx, {
      id: reportId,
      engagement_id: input.engagementId,
      number: await nextNumber(tx, now),
      revision: 1,
      title: input.title,
      summary_belief: input.belief,
      summary_certainty: input.certainty,
      summary_next_step: input.nextStep,
      status: 'draft',
      author_id: actor.personId,
      reviewer_id: null,
      check_code: newCheckCode(deps.ids),
      document: null,
      file_id: null,
      file_sha256: null,
      signature_areas: null,
      created_at: now,
      submitted_at: null,
      approved_at: null,
      released_at: null,
    })
    await replaceReportFindings(tx, reportId, input.findingIds)
    return ok({ reportId, engagementId: input.engagementId })
  }),
)

/** Changes a draft, or a report that the reviewer returned. */
export const editReport = operation('reports.edit', editReportSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const report = await reportFor(tx, actor, 'report.compose', input.reportId)
    if (!report.ok) return report
    const { row } = report.value
    if (row.author_id !== actor.personId) return err(notTheAuthor)
    if (!(await areAllPublished(tx, row.engagement_id, input.findingIds))) return err(findingNotPublished)
    const isMoved = await moveReport(tx, row.id, reportSteps.edit, {
      title: input.title,
      summary_belief: input.belief,
      summary_certainty: input.certainty,
      summary_next_step: input.nextStep,
    })
    if (!isMoved) return err(stepNotOpen('edited'))
    await replaceReportFindings(tx, row.id, input.findingIds)
    return ok({ reportId: row.id, engagementId: row.engagement_id })
  }),
)

/** Freezes the content and hands it to a reviewer, who is another consultant of the engagement. */
export const submitReport = operation('reports.submit', submitReportSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const report = await reportFor(tx, actor, 'report.compose', input.reportId)
    if (!report.ok) return report
    const { row, engagement } = report.value
    if (row.author_id !== actor.personId) return err(notTheAuthor)
    const isPossible =
      input.reviewerId !== row.author_id && engagement.resource.consultantPersonIds.includes(input.reviewerId)
    if (!isPossible) return err(reviewerNotPossible)
    const now = deps.clock.now()
    const document = await freezeReport(tx, deps, { ...row, reviewer_id: input.reviewerId }, engagement)
    const isMoved = await moveReport(tx, row.id, reportSteps.submit, {
      status: 'in_review',
      reviewer_id: input.reviewerId,
      document: JSON.stringify(document),
      submitted_at: now,
    })
    return isMoved ? ok({ reportId: row.id }) : err(stepNotOpen('submitted'))
  }),
)

async function areAllPublished(
  tx: Tx,
  engagementId: string,
  findingIds: readonly string[],
): Promise<boolean> {
  const published = new Set((await publishedFindings(tx, engagementId)).map((finding) => finding.findingId))
  return findingIds.every((findingId) => published.has(findingId))
}

/** "2026-001": the year and a running number without gaps. */
async function nextNumber(tx: Tx, now: number): Promise<string> {
  const prefix = `${new Date(now).getUTCFullYear()}-`
  const used = await countReportNumbers(tx, prefix)
  return `${prefix}${String(used + 1).padStart(3, '0')}`
}
