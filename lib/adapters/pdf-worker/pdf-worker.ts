import { readFile } from 'node:fs/promises'
import path from 'node:path'

import { Piscina } from 'piscina'
import { z } from 'zod'

import { err, ok } from '@/lib/core/result'
import type { PdfRenderer } from '@/lib/ports/pdf-renderer'

const timeLimitMilliseconds = 60_000
const heapLimitMebibytes = 768

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

/** Renders reports in one worker thread, which is started when first needed and ended when it runs too long. */
export function createPdfWorker(
  workerFile = path.join(/* turbopackIgnore: true */ process.cwd(), '.workers', 'render-report.mjs'),
): PdfRenderer & { readonly close: () => Promise<void> } {
  const pool = new Piscina({
    filename: workerFile,
    minThreads: 0,
    maxThreads: 1,
    idleTimeout: 60_000,
    resourceLimits: { maxOldGenerationSizeMb: heapLimitMebibytes },
  })
  return {
    render: async (document) => {
      try {
        const signal = AbortSignal.timeout(timeLimitMilliseconds)
        return ok(answer.parse(await pool.run(document, { signal })))
      } catch (error) {
        const isTimeout =
          error instanceof Error && (error.name === 'AbortError' || error.name === 'TimeoutError')
        return err({ code: isTimeout ? 'render_timed_out' : 'render_failed' })
      }
    },
    signatureFont: () => readFile(fontFile),
    close: () => pool.destroy(),
  }
}
