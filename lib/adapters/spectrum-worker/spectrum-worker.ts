import 'server-only'

import { z } from 'zod'

import { err } from '@/lib/core/result'
import type { FileStore } from '@/lib/ports/file-store'
import type { SpectrumComputer, SpectrumRefusal } from '@/lib/ports/spectrum-computer'

import { createWorkerPool, limitOf, workerFileOf } from '../worker-pool/worker-pool'
import type { SpectrumJob } from './compute-spectrum'

const limits = { milliseconds: 20_000, heapMebibytes: 512 }

const thinned = z.object({
  frequencies: z.array(z.number()),
  levels: z.array(z.number()),
  binWidth: z.number(),
  resolutionBandwidth: z.number(),
  windowName: z.string(),
  isWholePeriods: z.boolean(),
  sampleCount: z.int(),
})

const answer = z.discriminatedUnion('ok', [
  z.object({ ok: z.literal(true), value: thinned }),
  z.object({
    ok: z.literal(false),
    error: z.object({ code: z.literal('not_computable'), message: z.string() }),
  }),
])

/** Computes spectra in a worker thread of its own. */
export function createSpectrumWorker(
  files: FileStore,
  workerFile = workerFileOf('compute-spectrum'),
): SpectrumComputer & { readonly close: () => Promise<void> } {
  const pool = createWorkerPool(workerFile, limits)
  return {
    compute: async ({ fileId, ...request }) => {
      const job: SpectrumJob = { path: files.pathOf(fileId), ...request }
      try {
        return answer.parse(await pool.run(job))
      } catch (error) {
        if (limitOf(error) !== null) return err(tookTooLong)
        throw error
      }
    },
    close: pool.close,
  }
}

const tookTooLong: SpectrumRefusal = {
  code: 'took_too_long',
  message: 'The spectrum took too long. Zoom in to a shorter part of the record and try again.',
}
