import 'server-only'

import { sql } from 'kysely'

import type { Migration } from '@/migrations/migration'
import { migrations } from '@/migrations/migrations'

import type { Db } from './client'
import { withTx } from './tx'

const createHistory = sql`
  create table if not exists schema_migration (
    name text primary key,
    applied_at integer not null
  ) strict`

async function appliedNames(db: Db): Promise<ReadonlySet<string>> {
  await createHistory.execute(db)
  const rows = await sql<{ name: string }>`select name from schema_migration`.execute(db)
  return new Set(rows.rows.map((row) => row.name))
}

/** The migrations that this build knows and the database has not had yet, in order. */
export async function pendingMigrations(
  db: Db,
  known: readonly Migration[] = migrations,
): Promise<readonly Migration[]> {
  const applied = await appliedNames(db)
  return known.filter((migration) => !applied.has(migration.name))
}

/**
 * Applies what is pending, each migration in a transaction of its own together with its history row, so that a
 * failure leaves the schema as it was before that migration.
 * @returns the names applied.
 */
export async function migrate(
  db: Db,
  now: number,
  known: readonly Migration[] = migrations,
): Promise<readonly string[]> {
  const pending = await pendingMigrations(db, known)
  for (const migration of pending) {
    await withTx(db, async (tx) => {
      for (const statement of migration.up) await statement.execute(tx)
      await sql`insert into schema_migration (name, applied_at) values (${migration.name}, ${now})`.execute(
        tx,
      )
    })
  }
  return pending.map((migration) => migration.name)
}
