import { readFile } from 'node:fs/promises'
import path from 'node:path'

import { z } from 'zod'

import { err, ok } from '@/lib/core/result'
import type { PdfRenderer } from '@/lib/ports/pdf-renderer'

import { createWorkerPool, limitOf, workerFileOf } from '../worker-pool/worker-pool'

const limits = { milliseconds: 60_000, heapMebibytes: 768 }

const fontFile = path.join(
  /* turbopackIgnore: true */ process.cwd(),
  'pdf',
  'fonts',
  'SourceSans3-Regular.ttf',
)

const area = z.object({
  page: z.int().nonnegative(),
  rectangle: z.object({ x: z.number(), y: z.number(), width: z.number(), height: z.number() }),
})

const answer = z.object({
  bytes: z.instanceof(Uint8Array),
  areas: z.object({ author: area, reviewer: area }),
})

/** Renders reports in a worker thread of its own. */
export function createPdfWorker(
  workerFile = workerFileOf('render-report'),
): PdfRenderer & { readonly close: () => Promise<void> } {
  const pool = createWorkerPool(workerFile, limits)
  return {
    render: async (document) => {
      try {
        return ok(answer.parse(await pool.run(document)))
      } catch (error) {
        return err({ code: limitOf(error) === 'time' ? 'render_timed_out' : 'render_failed' })
      }
    },
    signatureFont: () => readFile(fontFile),
    close: pool.close,
  }
}
