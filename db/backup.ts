import 'server-only'

import Sqlite from 'better-sqlite3'

/**
 * Writes a consistent copy of a live database with SQLite's own backup interface.
 * A plain file copy of a database in use is behind or torn, so it is never used.
 */
export async function backUpDatabase(file: string, target: string): Promise<void> {
  const source = new Sqlite(file, { readonly: true })
  try {
    await source.backup(target)
  } finally {
    source.close()
  }
}
