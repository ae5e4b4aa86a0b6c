import 'server-only'

import { pendingMigrations } from '@/db/migrate'
import { finishInterruptedChecks } from '@/lib/domain/evidence/check-capture'

import { container } from './container'
import { startFeeCollector } from './fee-collector'
import { startOutboxDispatcher } from './outbox-dispatcher'

/** Reads the settings, opens the database, makes sure that its schema is this build's, and takes up cut-off checks. */
export async function startPortal(): Promise<void> {
  try {
    const { deps, log, env } = container()
    const pending = await pendingMigrations(deps.db)
    if (pending.length > 0) {
      const names = pending.map((migration) => migration.name).join(', ')
      throw new Error(`The database lacks ${names}. Run: npm run migrate`)
    }
    startOutboxDispatcher(container())
    startFeeCollector(container())
    const checksTakenUp = await finishInterruptedChecks(deps)
    log.info({ publicUrl: env.publicUrl, checksTakenUp }, 'portal started')
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`)
    process.exit(1)
  }
}
