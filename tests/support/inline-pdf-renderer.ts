import { readFile } from 'node:fs/promises'

import { ok } from '@/lib/core/result'
import type { PdfRenderer } from '@/lib/ports/pdf-renderer'
import { fontFile } from '@/pdf/fonts'
import { renderReport } from '@/pdf/render-report'

/** The real renderer in the test's own thread, so that no worker has to be built first. */
export function createInlinePdfRenderer(): PdfRenderer {
  return {
    render: async (document) => ok(await renderReport(document)),
    signatureFont: () => readFile(fontFile('SourceSans3-Regular')),
  }
}
