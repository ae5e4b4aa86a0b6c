import { Document } from '@react-pdf/renderer'

import type { ReportDocument } from '@/lib/core/report/report-document'

import { Findings } from './finding'
import { Limits } from './limits'
import { MethodAppendix } from './method-appendix'
import { Opening } from './opening'
import { PageFrame, pageHeights, type PaperSize } from './page-frame'
import { Evidence, Question } from './question'
import { SignaturePage } from './signature-page'

type ReportPdfProps = { readonly document: ReportDocument; readonly size: PaperSize }

/** The whole report in reading order: decide, understand, check, compute again, sign. */
export const ReportPdf = ({ document, size }: ReportPdfProps) => {
  const date = new Date(document.issuedAt)
  return (
    <Document
      title={`${document.title} (${document.number}, revision ${document.revision})`}
      author={document.practice.name}
      subject={`Engagement ${document.engagement.number} for ${document.clientCompany}`}
      creator="Quellbench"
      producer="Quellbench"
      language="en"
      pdfVersion="1.7"
      pageMode="useOutlines"
      creationDate={date}
      modificationDate={date}
    >
      <PageFrame document={document} size={size} bookmark="Report">
        <Opening document={document} />
        <Question engagement={document.engagement} />
        <Evidence evidence={document.evidence} />
        <Findings document={document} />
        <Limits document={document} />
        <MethodAppendix runs={document.runs} />
      </PageFrame>
      <PageFrame document={document} size={size}>
        <SignaturePage document={document} pageHeight={pageHeights[size]} />
      </PageFrame>
    </Document>
  )
}
