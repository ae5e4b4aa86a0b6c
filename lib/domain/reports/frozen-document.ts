import 'server-only'
import { z } from 'zod'

import type { ReportDocument } from '@/lib/core/report/report-document'
import type { SignatureArea } from '@/lib/ports/pdf-renderer'

/** The frozen content of a report that has been submitted; it was written by `freezeReport` and is never edited. */
export function parseDocument(text: string | null): ReportDocument {
  if (text === null) throw new Error('A report that was never submitted has no frozen document')
  const document: ReportDocument = JSON.parse(text)
  return document
}

const area = z.object({
  page: z.int().nonnegative(),
  rectangle: z.object({ x: z.number(), y: z.number(), width: z.number(), height: z.number() }),
})

const areas = z.object({ author: area, reviewer: area })

/** Where the two visible signatures of a rendered report stand. */
export function parseAreas(text: string | null): { author: SignatureArea; reviewer: SignatureArea } {
  return areas.parse(JSON.parse(text ?? 'null'))
}
