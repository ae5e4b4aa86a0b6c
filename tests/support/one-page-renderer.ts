import { PDFDocument } from '@cantoo/pdf-lib'
import { readFile } from 'node:fs/promises'

import { ok } from '@/lib/core/result'
import type { PdfRenderer } from '@/lib/ports/pdf-renderer'
import { fontFile } from '@/pdf/fonts'

/** A renderer for tests about what happens to a report, not about how it looks: one empty page with room to sign. */
export function createOnePageRenderer(): PdfRenderer {
  const box = { y: 440, width: 220, height: 84 }
  return {
    render: async () => {
      const document = await PDFDocument.create()
      document.addPage([595, 842])
      return ok({
        bytes: await document.save({ useObjectStreams: false }),
        areas: {
          author: { page: 0, rectangle: { x: 56, ...box } },
          reviewer: { page: 0, rectangle: { x: 316, ...box } },
        },
      })
    },
    signatureFont: () => readFile(fontFile('SourceSans3-Regular')),
  }
}
