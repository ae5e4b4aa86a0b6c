import 'server-only'
import path from 'node:path'

import { Piscina } from 'piscina'
import { z } from 'zod'

import { err, type Result } from '@/lib/core/result'
import type { CaptureAnalyser, CaptureRefusal, CaptureSummary } from '@/lib/ports/capture-analyser'
import type { FileStore } from '@/lib/ports/file-store'

import { jobOf, type CaptureJob } from './capture-job'

const timeLimitMilliseconds = 30_000

/** For the parser's own objects; the columns of samples lie outside of it and are bounded by the size of the text. */
const heapLimitMebibytes = 512

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

/** Reads captures in one worker thread, which is started when it is first needed and stopped when it runs too long. */
export function createCaptureWorker(
  files: FileStore,
  workerFile = path.join(/* turbopackIgnore: true */ process.cwd(), '.workers', 'analyse-capture.mjs'),
): CaptureAnalyser & { readonly close: () => Promise<void> } {
  const pool = new Piscina({
    filename: workerFile,
    minThreads: 0,
    maxThreads: 1,
    idleTimeout: 60_000,
    resourceLimits: { maxOldGenerationSizeMb: heapLimitMebibytes },
  })
  return {
    analyse: (evidenceId) => run(pool, jobOf(files, evidenceId)),
    close: () => pool.destroy(),
  }
}

async function run(pool: Piscina, job: CaptureJob): Promise<Result<CaptureSummary, CaptureRefusal>> {
  try {
    const answered: unknown = await pool.run(job, { signal: AbortSignal.timeout(timeLimitMilliseconds) })
    return answer.parse(answered)
  } catch (error) {
    if (!(error instanceof Error)) throw error
    if (error.name === 'AbortError' || error.name === 'TimeoutError') return err(tookTooLong)
    if ('code' in error && error.code === 'ERR_WORKER_OUT_OF_MEMORY') return err(neededTooMuch)
    throw error
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
