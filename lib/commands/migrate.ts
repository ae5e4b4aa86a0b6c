import { existsSync, mkdirSync } from 'node:fs'
import path from 'node:path'

import { backUpDatabase } from '@/db/backup'
import { openDatabase } from '@/db/client'
import { migrate, pendingMigrations } from '@/db/migrate'
import { parseEnv } from '@/lib/server/env'

/** Brings the database up to this build's schema; a database that exists is backed up first. */
async function run(): Promise<void> {
  const env = parseEnv(process.env)
  mkdirSync(env.dataFolder, { recursive: true })
  const existed = existsSync(env.databaseFile)
  const now = Date.now()
  const db = openDatabase(env.databaseFile)
  try {
    const pending = await pendingMigrations(db)
    if (pending.length > 0 && existed) {
      const backup = path.join(env.dataFolder, `before-migration-${now}.sqlite`)
      await backUpDatabase(env.databaseFile, backup)
      process.stdout.write(`Backup before migration: ${backup}\n`)
    }
    const applied = await migrate(db, now)
    process.stdout.write(
      applied.length > 0 ? `Applied ${applied.join(', ')}\n` : 'The schema is up to date\n',
    )
  } finally {
    await db.destroy()
  }
}

await run()
