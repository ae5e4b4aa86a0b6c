import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { openDatabase, type Db } from '@/db/client'
import { migrate } from '@/db/migrate'
import { createDiskFileStore } from '@/lib/adapters/file-store/disk-file-store'
import { randomIds } from '@/lib/adapters/random-ids/random-ids'
import { computeSpectrum } from '@/lib/adapters/spectrum-worker/compute-spectrum'
import { createStripePayments } from '@/lib/adapters/stripe/stripe-payments'
import type { Deps } from '@/lib/domain/deps'

import { createInlineCaptureAnalyser } from './inline-capture-analyser'
import { createInlinePdfRenderer } from './inline-pdf-renderer'
import { createQuickHasher } from './quick-hasher'

/** A clock that stands still until a test moves it. */
export type TestClock = { now: () => number; advance: (milliseconds: number) => void }

export type TestPortal = {
  readonly db: Db
  readonly deps: Deps
  readonly clock: TestClock
  readonly folder: string
  readonly close: () => Promise<void>
}

export const testStart = Date.UTC(2026, 11, 1, 9, 0, 0)

export const testWebhookSecret = 'whsec_secret_of_the_test'

/** Nothing listens here: a test that pays hands in an adapter that points to the payments stand-in. */
const unreachable = 'http://127.0.0.1:9'

/** A portal without its pages: a migrated database file and a file store of its own in a new folder. */
export async function openTestPortal(): Promise<TestPortal> {
  const folder = mkdtempSync(path.join(tmpdir(), 'quellbench-test-'))
  const db = openDatabase(path.join(folder, 'portal.sqlite'))
  await migrate(db, testStart)
  let now = testStart
  const clock: TestClock = {
    now: () => now,
    advance: (milliseconds) => {
      now += milliseconds
    },
  }
  const files = createDiskFileStore(path.join(folder, 'files'))
  const deps: Deps = {
    db,
    clock,
    ids: randomIds,
    files,
    captures: createInlineCaptureAnalyser(files),
    spectra: { compute: ({ fileId, ...job }) => computeSpectrum({ path: files.pathOf(fileId), ...job }) },
    passwords: createQuickHasher(),
    payments: createStripePayments({
      secretKey: 'sk_test_of_the_test',
      webhookSecret: testWebhookSecret,
      apiBase: new URL(unreachable),
      retries: 0,
    }),
    pdf: createInlinePdfRenderer(),
    settings: {
      practiceName: 'Tarn Hollow EMC',
      publicUrl: 'http://localhost:3000',
      practiceAddress: '1 Weir Lane, Tarn Hollow',
      authorityPassphrase: 'authority of the test',
      uploadLimitBytes: 64 * 1024 * 1024,
    },
    request: { id: 'test-request', address: '192.0.2.1', browserSecret: 'browser-of-the-test' },
  }
  const close = async () => {
    await db.destroy()
    rmSync(folder, { recursive: true, force: true })
  }
  return { db, deps, clock, folder, close }
}
