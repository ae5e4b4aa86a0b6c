import 'server-only'
import { existsSync } from 'node:fs'

import Sqlite from 'better-sqlite3'

/**
 * Writes a consistent copy of a live database with SQLite's own backup interface.
 * A plain file copy of a database in use is behind or torn, so it is never used.
 * @returns false when there is no database to copy yet.
 */
export async function backUpDatabase(file: string, target: string): Promise<boolean> {
  if (!existsSync(file)) return false
  const source = new Sqlite(file, { readonly: true })
  try {
    await source.backup(target)
  } finally {
    source.close()
  }
  return true
}
