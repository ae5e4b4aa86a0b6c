import 'server-only'

import { insertRemark, listRemarks, moveReport } from '@/db/repositories/report.repo'
import { withTx } from '@/db/tx'
import { err, ok } from '@/lib/core/result'

import { operation } from '../operation'
import { parseDocument } from './frozen-document'
import { reportFor } from './report-resource'
import { isOpen, reportSteps } from './report-steps'
import { noRemark, notTheReviewer, renderingFailed, stepNotOpen } from './reports.errors'
import { remarkSchema, reportIdSchema } from './reports.schema'

/** The reviewer notes what to change, section by section. */
export const addRemark = operation('reports.addRemark', remarkSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const report = await reportFor(tx, actor, 'report.review', input.reportId)
    if (!report.ok) return report
    const { row } = report.value
    if (row.reviewer_id !== actor.personId) return err(notTheReviewer)
    if (!isOpen('remark', row.status)) return err(stepNotOpen('remarked on'))
    await insertRemark(tx, {
      id: deps.ids.newId(),
      report_id: row.id,
      author_id: actor.personId,
      section: input.section,
      text: input.text,
      created_at: deps.clock.now(),
    })
    return ok({ reportId: row.id })
  }),
)

/** Sends the report back to its author with the remarks. */
export const returnReport = operation('reports.return', reportIdSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const report = await reportFor(tx, actor, 'report.review', input.reportId)
    if (!report.ok) return report
    const { row } = report.value
    if (row.reviewer_id !== actor.personId) return err(notTheReviewer)
    const remarks = await listRemarks(tx, row.id)
    const sinceSubmission = remarks.filter((remark) => remark.createdAt >= (row.submitted_at ?? 0))
    if (isOpen('return', row.status) && sinceSubmission.length === 0) return err(noRemark)
    const isMoved = await moveReport(tx, row.id, reportSteps.return, { status: 'returned' })
    return isMoved ? ok({ reportId: row.id }) : err(stepNotOpen('returned'))
  }),
)

/** The reviewer agrees with the frozen content; the PDF that both will sign is made of it. */
export const approveReport = operation('reports.approve', reportIdSchema, async (deps, actor, input) => {
  const report = await reportFor(deps.db, actor, 'report.review', input.reportId)
  if (!report.ok) return report
  const { row } = report.value
  if (row.reviewer_id !== actor.personId) return err(notTheReviewer)
  if (!isOpen('approve', row.status)) return err(stepNotOpen('approved'))
  const rendered = await deps.pdf.render(parseDocument(row.document))
  if (!rendered.ok) return err(renderingFailed)
  const fileId = deps.ids.newId()
  const stored = await deps.files.writeBytes(fileId, rendered.value.bytes)
  const isMoved = await withTx(deps.db, (tx) =>
    moveReport(tx, row.id, reportSteps.approve, {
      status: 'approved',
      file_id: fileId,
      file_sha256: stored.sha256,
      signature_areas: JSON.stringify(rendered.value.areas),
      approved_at: deps.clock.now(),
    }),
  )
  if (isMoved) return ok({ reportId: row.id })
  await deps.files.remove(fileId)
  return err(stepNotOpen('approved'))
})
