import 'server-only'
import path from 'node:path'

import { Piscina } from 'piscina'

/** What one job may take before its thread is ended. */
export type PoolLimits = { readonly milliseconds: number; readonly heapMebibytes: number }

export type WorkerPool = {
  /** Rejects with an error that `limitOf` knows where the job went over a limit. */
  readonly run: (job: unknown) => Promise<unknown>
  readonly close: () => Promise<void>
}

/** Where the build puts the thread of this name. */
export const workerFileOf = (name: string): string =>
  path.join(/* turbopackIgnore: true */ process.cwd(), '.workers', `${name}.mjs`)

/** One worker thread, which is started when it is first needed and ended when it runs too long. */
export function createWorkerPool(workerFile: string, limits: PoolLimits): WorkerPool {
  const pool = new Piscina({
    filename: workerFile,
    minThreads: 0,
    maxThreads: 1,
    idleTimeout: 60_000,
    resourceLimits: { maxOldGenerationSizeMb: limits.heapMebibytes },
  })
  return {
    run: (job) => pool.run(job, { signal: AbortSignal.timeout(limits.milliseconds) }),
    close: () => pool.destroy(),
  }
}

/** Which limit a failed job went over; null for a failure of another kind. */
export function limitOf(error: unknown): 'time' | 'memory' | null {
  if (!(error instanceof Error)) return null
  if (error.name === 'AbortError' || error.name === 'TimeoutError') return 'time'
  return 'code' in error && error.code === 'ERR_WORKER_OUT_OF_MEMORY' ? 'memory' : null
}
