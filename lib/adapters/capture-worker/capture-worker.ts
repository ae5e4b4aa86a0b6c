import 'server-only'

import { z } from 'zod'

import { err, type Result } from '@/lib/core/result'
import type { CaptureAnalyser, CaptureRefusal, CaptureSummary } from '@/lib/ports/capture-analyser'
import type { FileStore } from '@/lib/ports/file-store'

import { createWorkerPool, limitOf, workerFileOf, type WorkerPool } from '../worker-pool/worker-pool'
import { jobOf, type CaptureJob } from './capture-job'

/** The heap is for the parser's own objects; the columns of samples lie outside of it, bounded by the size of the text. */
const limits = { milliseconds: 30_000, heapMebibytes: 512 }

const summary = z.object({
  samples: z.int().positive(),
  startSeconds: z.number(),
  intervalSeconds: z.number().positive(),
  intervalSource: z.string(),
  warnings: z.array(z.string()),
  channels: z.array(
    z.object({ name: z.string(), unit: z.string(), minimum: z.number(), maximum: z.number() }),
  ),
})

const answer = z.discriminatedUnion('ok', [
  z.object({ ok: z.literal(true), value: summary }),
  z.object({
    ok: z.literal(false),
    error: z.object({ code: z.literal('not_readable'), message: z.string() }),
  }),
])

/** Reads captures in a worker thread of its own. */
export function createCaptureWorker(
  files: FileStore,
  workerFile = workerFileOf('analyse-capture'),
): CaptureAnalyser & { readonly close: () => Promise<void> } {
  const pool = createWorkerPool(workerFile, limits)
  return {
    analyse: (evidenceId) => run(pool, jobOf(files, evidenceId)),
    close: pool.close,
  }
}

async function run(pool: WorkerPool, job: CaptureJob): Promise<Result<CaptureSummary, CaptureRefusal>> {
  try {
    return answer.parse(await pool.run(job))
  } catch (error) {
    const limit = limitOf(error)
    if (limit === null) throw error
    return err(limit === 'time' ? tookTooLong : neededTooMuch)
  }
}

const tookTooLong: CaptureRefusal = {
  code: 'took_too_long',
  message:
    'The capture could not be read within 30 seconds. Export fewer channels or a shorter part of the record, then send it again.',
}

const neededTooMuch: CaptureRefusal = {
  code: 'took_too_long',
  message:
    'The capture needs more memory to be read than there is for one file. Export fewer channels or a shorter part of the record, then send it again.',
}
