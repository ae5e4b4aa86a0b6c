import 'server-only'
import path from 'node:path'

import { Piscina } from 'piscina'
import { z } from 'zod'

import { err } from '@/lib/core/result'
import type { FileStore } from '@/lib/ports/file-store'
import type { SpectrumComputer, SpectrumRefusal } from '@/lib/ports/spectrum-computer'

import type { SpectrumJob } from './compute-spectrum'

const timeLimitMilliseconds = 20_000
const heapLimitMebibytes = 512

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

/** Computes spectra in one worker thread, which is started when first needed and ended when it runs too long. */
export function createSpectrumWorker(
  files: FileStore,
  workerFile = path.join(/* turbopackIgnore: true */ process.cwd(), '.workers', 'compute-spectrum.mjs'),
): SpectrumComputer & { readonly close: () => Promise<void> } {
  const pool = new Piscina({
    filename: workerFile,
    minThreads: 0,
    maxThreads: 1,
    idleTimeout: 60_000,
    resourceLimits: { maxOldGenerationSizeMb: heapLimitMebibytes },
  })
  return {
    compute: async ({ fileId, ...request }) => {
      const job: SpectrumJob = { path: files.pathOf(fileId), ...request }
      try {
        return answer.parse(await pool.run(job, { signal: AbortSignal.timeout(timeLimitMilliseconds) }))
      } catch (error) {
        if (error instanceof Error && isOverLimit(error)) return err(tookTooLong)
        throw error
      }
    },
    close: () => pool.destroy(),
  }
}

const isOverLimit = (error: Error): boolean =>
  error.name === 'AbortError' ||
  error.name === 'TimeoutError' ||
  ('code' in error && error.code === 'ERR_WORKER_OUT_OF_MEMORY')

const tookTooLong: SpectrumRefusal = {
  code: 'took_too_long',
  message: 'The spectrum took too long. Zoom in to a shorter part of the record and try again.',
}
