import type { Metadata } from 'next'

import { RemarkList } from '@/components/reports/remark-list'
import { ReportIdentity } from '@/components/reports/report-identity'
import { ReportStatus } from '@/components/reports/report-status'
import { ReportSummary } from '@/components/reports/report-summary'
import { ReviewSheet } from '@/components/reports/review-sheet'
import { SignSheet } from '@/components/reports/sign-sheet'
import { SubmitSheet } from '@/components/reports/submit-sheet'
import { PageBody } from '@/components/shell/page-body'
import { buttonClass } from '@/components/ui/button-class'
import { certificates, reportReading } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { addRemark, approveReport, returnReport, signReport, submitReport } from '../actions'

type Props = PageProps<'/engagements/[engagementId]/reports/[reportId]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { reportId } = await params
  const report = await query(reportReading.getReport, { reportId })
  return { title: `Report ${report.number}` }
}

export default async function ReportPage({ params }: Props) {
  const { engagementId, reportId } = await params
  const report = await query(reportReading.getReport, { reportId })
  const { work } = report
  const certificate = work?.steps.sign ? await query(certificates.myCertificate) : null
  return (
    <PageBody aside={<ReportIdentity {...report} />}>
      <div className="flex flex-wrap items-center justify-between gap-3">
        <div>
          <h2 className="text-xl">{report.title}</h2>
          <ReportStatus status={report.status} />
        </div>
        <div className="flex flex-wrap gap-3">
          {work?.hasPreview ? (
            <a className={buttonClass('plain')} href={`/api/reports/${reportId}/preview`}>
              Preview (PDF)
            </a>
          ) : null}
          {report.fileSha256 ? (
            <a className={buttonClass('primary')} href={`/api/reports/${reportId}`}>
              Download the signed report
            </a>
          ) : null}
        </div>
      </div>
      {work?.steps.submit ? (
        <SubmitSheet
          reportId={reportId}
          editHref={`/engagements/${engagementId}/reports/${reportId}/edit`}
          reviewers={work.reviewers}
          submit={submitReport}
        />
      ) : null}
      {work?.steps.review ? (
        <ReviewSheet reportId={reportId} approve={approveReport} remark={addRemark} giveBack={returnReport} />
      ) : null}
      {work?.steps.sign ? (
        <SignSheet reportId={reportId} hasCertificate={certificate !== null} sign={signReport} />
      ) : null}
      {work && work.remarks.length > 0 ? <RemarkList remarks={work.remarks} /> : null}
      <ReportSummary belief={report.belief} certainty={report.certainty} nextStep={report.nextStep} />
    </PageBody>
  )
}
