import { PDFDocument } from '@cantoo/pdf-lib'
import { renderToBuffer } from '@react-pdf/renderer'

import type { ReportDocument } from '@/lib/core/report/report-document'
import type { RenderedReport } from '@/lib/ports/pdf-renderer'

import { registerFonts } from './fonts'
import type { PaperSize } from './report/page-frame'
import { ReportPdf } from './report/report-pdf'
import { signatureBoxes } from './report/signature-boxes'

/**
 * The report as a PDF 1.7 file with an outline, and where its two signatures go. The same document gives the same
 * bytes: the only date in the file is the document's own.
 */
export async function renderReport(
  document: ReportDocument,
  size: PaperSize = 'A4',
): Promise<RenderedReport> {
  registerFonts()
  const bytes = new Uint8Array(await renderToBuffer(<ReportPdf document={document} size={size} />))
  const page = (await PDFDocument.load(bytes, { updateMetadata: false })).getPageCount() - 1
  return {
    bytes,
    areas: {
      author: { page, rectangle: signatureBoxes.author },
      reviewer: { page, rectangle: signatureBoxes.reviewer },
    },
  }
}
