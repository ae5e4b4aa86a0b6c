import 'server-only'

import { findPerson, listConsultants } from '@/db/repositories/person.repo'
import {
  listRemarks,
  listReportFindingIds,
  listReportsOf,
  listSignatures,
  type ReportRow,
} from '@/db/repositories/report.repo'
import type { Actor } from '@/lib/authz/actor'
import { isAllowed, notFound } from '@/lib/authz/authorize'
import { err, ok } from '@/lib/core/result'

import type { Deps } from '../deps'
import { engagementFor, type LoadedEngagement } from '../engagements/engagement-resource'
import { publishedFindings } from '../findings/published-findings'
import { operation } from '../operation'
import { parseDocument } from './frozen-document'
import { reportHeadingOf } from './report-dto'
import { reportFor } from './report-resource'
import { isOpen } from './report-steps'
import { renderingFailed } from './reports.errors'
import { engagementIdSchema, reportIdSchema } from './reports.schema'

/** The reports of an engagement: all of them for its consultants, released ones for the client. */
export const listReports = operation('reports.list', engagementIdSchema, async (deps, actor, input) => {
  const engagement = await engagementFor(deps.db, actor, 'report.readReleased', input.engagementId)
  if (!engagement.ok) return engagement
  const rows = await listReportsOf(deps.db, input.engagementId)
  const visible = rows.filter((row) => maySee(actor, row, engagement.value))
  return ok({
    mayCompose: isAllowed(actor, 'report.compose', engagement.value.resource),
    reports: visible.map(reportHeadingOf),
  })
})

/** One report with what its reader may do next. A client sees a released report and nothing before. */
export const getReport = operation('reports.get', reportIdSchema, async (deps, actor, input) => {
  const report = await reportFor(deps.db, actor, 'report.readReleased', input.reportId)
  if (!report.ok) return report
  const { row, engagement } = report.value
  if (!maySee(actor, row, engagement)) return err(notFound)
  const isConsultant = isAllowed(actor, 'report.readDraft', engagement.resource)
  const signatures = await listSignatures(deps.db, row.id)
  return ok({
    ...reportHeadingOf(row),
    engagementId: row.engagement_id,
    belief: row.summary_belief,
    certainty: row.summary_certainty,
    nextStep: row.summary_next_step,
    checkCode: row.check_code,
    fileSha256: isOpen('read', row.status) ? row.file_sha256 : null,
    authorName: await nameOf(deps, row.author_id),
    reviewerName: row.reviewer_id ? await nameOf(deps, row.reviewer_id) : null,
    signatures: await Promise.all(
      signatures.map(async (signature) => ({
        role: signature.role,
        name: await nameOf(deps, signature.person_id),
        signedAt: signature.signed_at,
      })),
    ),
    work: isConsultant ? await workOn(deps, actor, row, engagement) : null,
  })
})

/** What only the practice sees: findings chosen, remarks, possible reviewers, and the steps open to this person. */
async function workOn(deps: Deps, actor: Actor, row: ReportRow, engagement: LoadedEngagement) {
  const consultants = await listConsultants(deps.db)
  const isAuthor = row.author_id === actor.personId
  const isReviewer = row.reviewer_id === actor.personId
  return {
    findingIds: await listReportFindingIds(deps.db, row.id),
    remarks: await listRemarks(deps.db, row.id),
    reviewers: consultants.filter(
      ({ personId }) =>
        personId !== row.author_id && engagement.resource.consultantPersonIds.includes(personId),
    ),
    steps: {
      edit: isAuthor && isOpen('edit', row.status),
      submit: isAuthor && isOpen('submit', row.status),
      review: isReviewer && isOpen('approve', row.status),
      sign:
        (isAuthor && isOpen('signAsAuthor', row.status)) ||
        (isReviewer && isOpen('signAsReviewer', row.status)),
    },
    hasPreview: row.document !== null,
  }
}

/** The published findings that a report of this engagement may hold. */
export const offeredFindings = operation(
  'reports.offeredFindings',
  engagementIdSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'report.compose', input.engagementId)
    if (!engagement.ok) return engagement
    const findings = await publishedFindings(deps.db, input.engagementId)
    return ok(findings.map(({ findingId, number, claim }) => ({ findingId, number, claim })))
  },
)

/** The frozen content as a PDF without signatures, for author and reviewer. */
export const previewReport = operation('reports.preview', reportIdSchema, async (deps, actor, input) => {
  const report = await reportFor(deps.db, actor, 'report.readDraft', input.reportId)
  if (!report.ok) return report
  const { row } = report.value
  if (row.document === null) return err(notFound)
  const rendered = await deps.pdf.render(parseDocument(row.document))
  if (!rendered.ok) return err(renderingFailed)
  const { bytes } = rendered.value
  return ok({
    name: `report-${row.number}-unsigned.pdf`,
    sizeBytes: bytes.byteLength,
    body: new Blob([Uint8Array.from(bytes)]).stream(),
  })
})

/** The file as it stands: the signed one for the client, the one under work for the consultants. */
export const openReportFile = operation('reports.openFile', reportIdSchema, async (deps, actor, input) => {
  const report = await reportFor(deps.db, actor, 'report.readReleased', input.reportId)
  if (!report.ok) return report
  const { row, engagement } = report.value
  if (!maySee(actor, row, engagement) || row.file_id === null) return err(notFound)
  return ok({
    name: `report-${row.number}-revision-${row.revision}.pdf`,
    body: deps.files.stream(row.file_id),
  })
})

function maySee(actor: Actor, row: ReportRow, engagement: LoadedEngagement): boolean {
  return isOpen('read', row.status) || isAllowed(actor, 'report.readDraft', engagement.resource)
}

async function nameOf(deps: Deps, personId: string): Promise<string> {
  const person = await findPerson(deps.db, personId)
  return person?.name ?? ''
}
