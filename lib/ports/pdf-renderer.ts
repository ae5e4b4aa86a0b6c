import type { ReportDocument } from '@/lib/core/report/report-document'
import type { Result } from '@/lib/core/result'

export type RenderError = { readonly code: 'render_timed_out' | 'render_failed' }

/** Where a visible signature goes: points from the lower left corner of the page. */
export type SignatureArea = {
  /** Counted from 0. */
  readonly page: number
  readonly rectangle: {
    readonly x: number
    readonly y: number
    readonly width: number
    readonly height: number
  }
}

export type RenderedReport = {
  readonly bytes: Uint8Array
  readonly areas: { readonly author: SignatureArea; readonly reviewer: SignatureArea }
}

/** Turns a frozen document into a PDF, off the request loop. */
export type PdfRenderer = {
  readonly render: (document: ReportDocument) => Promise<Result<RenderedReport, RenderError>>
  /** A complete TrueType font for the text of a visible signature. */
  readonly signatureFont: () => Promise<Uint8Array>
}
