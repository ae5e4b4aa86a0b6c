import 'server-only'
import { mkdirSync } from 'node:fs'

import type { Logger } from 'pino'

import { openDatabase } from '@/db/client'
import { createArgon2Hasher } from '@/lib/adapters/argon2/argon2-hasher'
import { createCaptureWorker } from '@/lib/adapters/capture-worker/capture-worker'
import { createDiskFileStore } from '@/lib/adapters/file-store/disk-file-store'
import { createPdfWorker } from '@/lib/adapters/pdf-worker/pdf-worker'
import { createResendMailer } from '@/lib/adapters/resend/resend-mailer'
import { createSpectrumWorker } from '@/lib/adapters/spectrum-worker/spectrum-worker'
import { createStripePayments } from '@/lib/adapters/stripe/stripe-payments'
import { randomIds } from '@/lib/adapters/random-ids/random-ids'
import { systemClock } from '@/lib/adapters/system-clock/system-clock'
import type { Deps } from '@/lib/domain/deps'
import type { Mailer } from '@/lib/ports/mailer'

import { parseEnv, type Env } from './env'
import { createLog } from './log'

/** What one running portal holds: settings, log and everything that services need except the request. */
export type Container = {
  readonly env: Env
  readonly log: Logger
  readonly deps: Omit<Deps, 'request'>
  readonly mailer: Mailer
}

function createContainer(): Container {
  const env = parseEnv(process.env)
  mkdirSync(env.dataFolder, { recursive: true })
  const files = createDiskFileStore(env.evidenceFolder)
  return {
    env,
    log: createLog(env.logLevel),
    mailer: createResendMailer(env.resend),
    deps: {
      db: openDatabase(env.databaseFile),
      clock: systemClock,
      ids: randomIds,
      files,
      captures: createCaptureWorker(files),
      spectra: createSpectrumWorker(files),
      passwords: createArgon2Hasher(),
      payments: createStripePayments(env.stripe),
      pdf: createPdfWorker(),
      settings: {
        practiceName: env.practice.name,
        practiceAddress: env.practice.address,
        publicUrl: env.publicUrl,
        uploadLimitBytes: env.uploadLimitBytes,
        authorityPassphrase: env.authorityPassphrase,
      },
    },
  }
}

// The bundler may load this module more than once in one process; the database is opened once all the same.
const shared = globalThis as typeof globalThis & { quellbenchContainer?: Container }

export function container(): Container {
  shared.quellbenchContainer ??= createContainer()
  return shared.quellbenchContainer
}
