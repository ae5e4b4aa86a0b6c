import 'server-only'
import { AsyncLocalStorage } from 'node:async_hooks'

import Sqlite from 'better-sqlite3'
import {
  CompiledQuery,
  Kysely,
  SqliteDialect,
  SqliteDriver,
  type DatabaseConnection,
  type SqliteDialectConfig,
  type Transaction,
} from 'kysely'

import type { Database } from './schema'

export type Db = Kysely<Database>
export type Tx = Transaction<Database>

/** True while a `withTx` callback runs: only its own handle may be used then. */
export const insideTransaction = new AsyncLocalStorage<true>()

class ImmediateSqliteDriver extends SqliteDriver {
  override async acquireConnection(): Promise<DatabaseConnection> {
    // The driver has one connection: the root handle would wait for the transaction that waits for it.
    if (insideTransaction.getStore()) {
      throw new Error('The root database was used inside a transaction; use the transaction handle instead')
    }
    return super.acquireConnection()
  }

  override async beginTransaction(connection: DatabaseConnection): Promise<void> {
    // A plain BEGIN that reads and then writes fails at once with SQLITE_BUSY_SNAPSHOT.
    await connection.executeQuery(CompiledQuery.raw('begin immediate'))
  }
}

class ImmediateSqliteDialect extends SqliteDialect {
  readonly #config: SqliteDialectConfig

  constructor(config: SqliteDialectConfig) {
    super(config)
    this.#config = config
  }

  override createDriver(): SqliteDriver {
    return new ImmediateSqliteDriver(this.#config)
  }
}

/** Opens the database file with write-ahead logging, full synchronisation and foreign keys on. */
export function openDatabase(file: string): Db {
  const sqlite = new Sqlite(file)
  sqlite.pragma('journal_mode = WAL')
  sqlite.pragma('synchronous = FULL')
  sqlite.pragma('foreign_keys = ON')
  sqlite.pragma('busy_timeout = 5000')
  return new Kysely<Database>({ dialect: new ImmediateSqliteDialect({ database: sqlite }) })
}
